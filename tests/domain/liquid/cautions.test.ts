import { describe, expect, it } from 'vitest';
import { cautions, cautionsFor, largeTankFromL, refusalOf } from '~/domain/liquid/cautions';
import { densitySentence } from '~/domain/liquid/density-sentence';
import { liquidCodes, liquids, type LiquidCode } from '~/domain/liquid/liquids';
import { liquidCode } from '~/domain/tank/settings';

const words = (liquid: LiquidCode, capacityL = 100): string =>
  cautionsFor(liquid, capacityL)
    .map((key) => cautions[key])
    .join(' ');

describe('every liquid carries the cautions it must', () => {
  it.each(liquidCodes)('%s: weight, and the trade sentence last', (code) => {
    const keys = cautionsFor(code, 100);
    expect(keys).toContain('weight');
    expect(keys.at(-1)).toBe('not-for-trade');
    expect(new Set(keys).size).toBe(keys.length);
  });

  it('the trade sentence says that codes and licensed practice come first', () => {
    expect(cautions['not-for-trade']).toBe(
      'Not for trade or fiscal measurement. Local codes and licensed practice come first.',
    );
  });

  it('drinking water: a stick of its own, clean, and safe materials', () => {
    expect(words('drinking-water')).toMatch(/a stick for this tank alone/);
    expect(words('drinking-water')).toMatch(/disinfect/);
    expect(words('drinking-water')).toMatch(/materials made for drinking water/);
  });

  it('petrol: no flame, bonding, waiting, no fill indoors, protected electrics', () => {
    for (const part of [
      /flame/,
      /bare metal/,
      /wait after filling/,
      /No metered fill .* indoors/,
      /ignition-protected/,
    ]) {
      expect(words('petrol')).toMatch(part);
    }
  });

  it.each<LiquidCode>(['diesel', 'heating-oil'])('%s: no flame, and waiting', (code) => {
    expect(words(code)).toMatch(/No flame/);
    expect(words(code)).toMatch(/wait for the foam/);
  });

  it.each<LiquidCode>(['grey-water', 'black-water'])(
    '%s: air, hands, and never the water stick',
    (code) => {
      expect(words(code)).toMatch(/fresh air/);
      expect(words(code)).toMatch(/never dip drinking water with this stick/);
    },
  );

  it('an unknown liquid: its safety sheet first', () => {
    expect(words('other')).toMatch(/safety sheet/);
  });

  it('a tank that could be entered says never to', () => {
    expect(cautionsFor('diesel', largeTankFromL - 1)).not.toContain('large-tank');
    expect(cautionsFor('diesel', largeTankFromL)).toContain('large-tank');
    for (const code of liquidCodes) expect(words(code, 5000)).toMatch(/Never enter a tank/);
  });

  it('every caution of the list is used by some tank', () => {
    const used = new Set(liquidCodes.flatMap((code) => cautionsFor(code, 5000)));
    expect([...used].sort()).toEqual(Object.keys(cautions).sort());
  });
});

describe('LPG is refused with the reason', () => {
  it.each(['LPG', 'lpg tank', 'Propane', 'butane/propane', 'CNG'])('%s', (name) => {
    expect(refusalOf(name)).toMatch(/under pressure.*80 %.*never be opened or dipped/s);
  });

  it.each(['Diesel', 'Drinking water', 'clpgx'])('%s is no gas', (name) => {
    expect(refusalOf(name)).toBeNull();
  });

  it('the list does not hold it and the schema says why', () => {
    expect(liquidCodes as readonly string[]).not.toContain('lpg');
    const answer = liquidCode.safeParse('lpg');
    expect(answer.success).toBe(false);
    expect(answer.error?.issues[0]?.message).toMatch(/LPG is not offered/);
  });
});

describe('densities lie where their sources say', () => {
  // EN 590: 820–845; EN 228 (from memory): 720–775; ISO 22241-1: 1087–1093 kg/m³
  it.each<[LiquidCode, number, number]>([
    ['diesel', 820, 845],
    ['petrol', 720, 775],
    ['urea-solution', 1087, 1093],
    ['drinking-water', 992, 1000],
  ])('%s between %d and %d', (code, low, high) => {
    expect(liquids[code].densityKgPerM3).toBeGreaterThanOrEqual(low);
    expect(liquids[code].densityKgPerM3).toBeLessThanOrEqual(high);
  });

  it('is said on paper, typed or listed', () => {
    expect(densitySentence({ liquid: 'diesel', densityKgPerM3: null })).toBe(
      'Kilograms: diesel of 840\u00a0kg\u00a0per\u00a0m³.',
    );
    expect(densitySentence({ liquid: 'other', densityKgPerM3: 912.5 })).toBe(
      'Kilograms: this liquid of 912.5\u00a0kg\u00a0per\u00a0m³.',
    );
  });
});
