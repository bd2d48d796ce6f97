import { describe, expect, it } from 'vitest';
import { DipwrightError } from '~/domain/errors';
import { changedSettings, startingSettings } from '~/domain/tank/complete-settings';
import { tankSettings, type TankSettings } from '~/domain/tank/settings';

function pointersOf(before: TankSettings, change: Partial<TankSettings>, at = ''): string[] {
  try {
    changedSettings(before, change, at);
  } catch (error) {
    if (error instanceof DipwrightError) return error.faults.map(({ pointer }) => pointer);
    throw error;
  }
  return [];
}

it('a new tank begins with the safe fill of its liquid, and nothing called unusable', () => {
  expect(startingSettings('heating-oil')).toEqual({
    liquid: 'heating-oil',
    densityKgPerM3: null,
    safeFillPercent: 97,
    outletMm: null,
    referenceHeightMm: null,
    measuredBy: 'tape',
    sizePlusMinusMm: 2,
    dipPlusMinusMm: 2,
  });
});

describe('a change', () => {
  const diesel = startingSettings('diesel');

  it('leaves what it does not name', () => {
    expect(changedSettings(diesel, { outletMm: 40, safeFillPercent: undefined })).toEqual({
      ...diesel,
      outletMm: 40,
    });
  });

  it('takes the ± of single sizes as a whole, and has one spelling for none', () => {
    const own = changedSettings(diesel, { ownSizePlusMinusMm: { 'body/length': 0.5 } });
    expect(own.ownSizePlusMinusMm).toEqual({ 'body/length': 0.5 });
    expect(changedSettings(own, { outletMm: 40 }).ownSizePlusMinusMm).toEqual({
      'body/length': 0.5,
    });
    expect(
      changedSettings(own, { ownSizePlusMinusMm: { 'body/width': 1 } }).ownSizePlusMinusMm,
    ).toEqual({ 'body/width': 1 });
    expect(changedSettings(own, { ownSizePlusMinusMm: {} })).toEqual(diesel);
  });

  it.each([
    [{ 'body/length': -1 }, 'A ± is 0 or more.'],
    [{ 'body/length': 1001 }, 'A ± is at most 1000 mm.'],
    [{ 'body/length': '2' }, 'Give the ± of a size in millimetres.'],
    [
      Object.fromEntries(Array.from({ length: 401 }, (_, i) => [`s${i}/length`, 1])),
      'At most 400 sizes may have a ± of their own.',
    ],
    [[1], 'Give the ± of single sizes as an object: { "body/length": 0.5 }.'],
  ])('refuses a ± of single sizes that is none: %o', (own, sentence) => {
    const read = tankSettings.safeParse({ ...diesel, ownSizePlusMinusMm: own });
    expect(read.error?.issues.map(({ message }) => message)).toEqual([sentence]);
  });

  it('needs a density for "other", and for nothing else', () => {
    expect(pointersOf(diesel, { liquid: 'other' })).toEqual(['/densityKgPerM3']);
    expect(pointersOf(diesel, { densityKgPerM3: 850 }, '/settings')).toEqual([
      '/settings/densityKgPerM3',
    ]);
    const other = changedSettings(diesel, { liquid: 'other', densityKgPerM3: 870 });
    expect(other.densityKgPerM3).toBe(870);
    expect(changedSettings(other, { liquid: 'diesel' }).densityKgPerM3).toBeNull();
    expect(pointersOf(other, { densityKgPerM3: null })).toEqual(['/densityKgPerM3']);
  });

  it('takes the ± of a size from how it was found', () => {
    const drawing = changedSettings(diesel, { measuredBy: 'drawing' });
    expect(drawing.sizePlusMinusMm).toBe(1);
    expect(pointersOf(drawing, { sizePlusMinusMm: 5 })).toEqual(['/sizePlusMinusMm']);
    const stated = changedSettings(drawing, { measuredBy: 'stated', sizePlusMinusMm: 5 });
    expect(stated.sizePlusMinusMm).toBe(5);
    expect(changedSettings(stated, { measuredBy: 'tape' }).sizePlusMinusMm).toBe(2);
  });
});
