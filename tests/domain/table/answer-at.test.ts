import { describe, expect, it } from 'vitest';
import { DipwrightError } from '~/domain/errors';
import {
  answerAt,
  densityOf,
  safeFillL,
  safeFillMm,
  unusableL,
  type DipTable,
} from '~/domain/table/answer-at';
import { curveFromRows } from '~/domain/table/curve';
import type { TankSettings } from '~/domain/tank/settings';

const plain: TankSettings = {
  liquid: 'diesel',
  densityKgPerM3: null,
  safeFillPercent: 95,
  outletMm: 40,
  referenceHeightMm: null,
  measuredBy: 'tape',
  sizePlusMinusMm: 2,
  dipPlusMinusMm: 2,
};

/**
 * A V hull 600 wide at the top, 500 deep, 1200 long, apex down: V = 0.00072 h² litres, worked by
 * hand; dV/dh = 0.00144 h L/mm. Rows every 10 mm, ± rising evenly from 0 to 2 L.
 */
function hull(settings: TankSettings = plain): DipTable {
  const depths = Array.from({ length: 51 }, (_, i) => 10 * i);
  return {
    curve: curveFromRows(
      depths.map((h) => ({ depthMm: h, volumeL: 0.00072 * h * h, surfaceCm2: 0.00144 * h * 1e4 })),
    ),
    plusMinusL: depths.map((h) => (2 * h) / 500),
    heightMm: 500,
    capacityL: 180,
    settings,
  };
}

describe('the figures of a dip', () => {
  it('of a V hull: half the stick is a quarter of the tank', () => {
    const answer = answerAt(hull(), 250);
    expect(answer.volumeL).toBeCloseTo(45, 9);
    // unusable below the outlet at 40 mm: 0.00072 · 1600 = 1.152 L
    expect(answer.usableL).toBeCloseTo(45 - 1.152, 9);
    // safe fill 95 % of 180 = 171 L
    expect(answer.roomL).toBeCloseTo(126, 9);
    expect(answer.aboveSafeFillL).toBe(0);
    // 840 kg/m³ of the liquids list
    expect(answer.massKg).toBeCloseTo(37.8, 9);
    expect(answer.ullageMm).toBe(250);
  });

  it('places safe fill, unusable and usable: 171.0 L at 487.3 mm, 1.15 L, 169.85 L', () => {
    const table = hull();
    expect(safeFillL(table)).toBeCloseTo(171, 9);
    // √(171 / 0.00072)
    expect(safeFillMm(table)).toBeCloseTo(487.34, 2);
    expect(unusableL(table)).toBeCloseTo(1.152, 9);
    expect(safeFillL(table) - unusableL(table)).toBeCloseTo(169.848, 9);
  });

  it('never gives less than nothing: below the outlet no usable, above safe fill no room', () => {
    expect(answerAt(hull(), 30).usableL).toBe(0);
    const full = answerAt(hull(), 500);
    expect(full.roomL).toBe(0);
    expect(full.aboveSafeFillL).toBeCloseTo(9, 9);
  });

  it('calls nothing unusable where no outlet was told, all of it where the outlet is above the roof', () => {
    expect(unusableL(hull({ ...plain, outletMm: null }))).toBe(0);
    expect(unusableL(hull({ ...plain, outletMm: 900 }))).toBeCloseTo(180, 9);
  });

  it('puts the safe fill of the whole brim at the end of the stick', () => {
    expect(safeFillMm(hull({ ...plain, safeFillPercent: 100 }))).toBeCloseTo(500, 6);
  });

  it('has no reading for a safe fill that the stick does not reach', () => {
    expect(safeFillMm({ ...hull({ ...plain, safeFillPercent: 100 }), capacityL: 200 })).toBeNull();
  });

  it('takes the ± on the straight line between the rows', () => {
    expect(answerAt(hull(), 250).plusMinusL).toBeCloseTo(1, 12);
    expect(answerAt(hull(), 255).plusMinusL).toBeCloseTo(1.02, 12);
    expect(answerAt(hull(), 500).plusMinusL).toBeCloseTo(2, 12);
  });

  it('weighs by the typed density where one was typed', () => {
    expect(densityOf({ ...plain, liquid: 'other', densityKgPerM3: 870 })).toBe(870);
    expect(answerAt(hull({ ...plain, densityKgPerM3: 1000 }), 250).massKg).toBeCloseTo(45, 9);
  });

  it.each([-0.1, 500.1, Number.NaN])('asks %s mm back', (depthMm) => {
    expect(() => answerAt(hull(), depthMm)).toThrow(DipwrightError);
  });
});
