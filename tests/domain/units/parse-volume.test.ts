import { describe, expect, it } from 'vitest';
import { parseVolume } from '~/domain/units/parse-volume';

describe('parseVolume', () => {
  it.each([
    ['55.5', 55.5],
    ['55,5 L', 55.5],
    ['20 litres', 20],
    ['500 ml', 0.5],
    ['2 m³', 2000],
    ['3*20', 60],
    ['12 US gal', 12 * 3.785411784],
    ['12 U.S. gallons', 12 * 3.785411784],
    ['10 imp gal', 45.4609],
    ['10 UK gallons', 45.4609],
    ['10 imperial gallons', 45.4609],
    ['20 L + 2 US gal', 20 + 2 * 3.785411784],
  ])('%s is %d L', (text, litres) => {
    expect(parseVolume(text, 'l')).toEqual({ litres: expect.closeTo(litres, 5) as number });
  });

  it('reads a bare number in the working unit', () => {
    expect(parseVolume('10', 'usgal')).toEqual({
      litres: expect.closeTo(37.85411784, 5) as number,
    });
    expect(parseVolume('10', 'impgal')).toEqual({ litres: expect.closeTo(45.4609, 5) as number });
  });

  it.each(['12 gal', '12 gallons', 'gal', '3 L + 1 gal'])('%s: asks which gallon', (text) => {
    for (const unit of ['l', 'usgal', 'impgal'] as const) {
      expect(parseVolume(text, unit)).toEqual({
        refused: 'Say which gallon: write “US gal” (3.785 L) or “imp gal” (4.546 L).',
      });
    }
  });

  it.each([
    ['', 'Type a volume, such as 55.5 L or 12 US gal.'],
    ['5 kg', '“kg” is not a unit of volume here: use L, US gal or imp gal.'],
    ['1:9', '“1:9” cannot be read as a volume: write it like 55.5 L or 12 US gal.'],
  ])('%s is refused', (text, refused) => {
    expect(parseVolume(text, 'l')).toEqual({ refused });
  });
});
