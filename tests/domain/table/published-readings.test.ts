import { describe, expect, it } from 'vitest';
import { answerAt, safeFillL, safeFillMm, type DipTable } from '~/domain/table/answer-at';
import { computeTable } from '~/domain/table/compute-table';
import { curveFromRows, depthAt, volumeAt } from '~/domain/table/curve';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import { box, cylinder, design } from './designs';

const settingsOf = (densityKgPerM3: number, safeFillPercent = 100): TankSettings => ({
  liquid: 'other',
  densityKgPerM3,
  safeFillPercent,
  outletMm: null,
  referenceHeightMm: null,
  measuredBy: 'tape',
  sizePlusMinusMm: 2,
  dipPlusMinusMm: 2,
});

/** A computed table as look-ups use it; no ± of its own. */
async function looked(tank: TankDocument, settings: TankSettings): Promise<DipTable> {
  const { rows, heightMm, capacityL } = await computeTable(tank, { stepMm: 100 });
  const plusMinusL = rows.map(() => 0);
  return { curve: curveFromRows(rows), plusMinusL, heightMm, capacityL, settings };
}

describe('a published tank table between two of its rows', () => {
  // F. Yusuf, "Bunker Survey Calculation", sevensurveyor.com, 27 March 2010. A re-blogged copy misprints the
  // divisor as 3.30 − 3.05 and the density as 0.9870
  const rows = [
    [3200, 157_200],
    [3300, 163_600],
  ] as const;
  const slopeLPerMm = 64;
  const curve = curveFromRows(
    rows.map(([depthMm, volumeL]) => ({ depthMm, volumeL, surfaceCm2: slopeLPerMm * 1e4 })),
  );

  it('reads 161.68 m³ at 3.27 m, and 3.27 m at 161.68 m³ (V3.13)', () => {
    expect(volumeAt(curve, 3270)).toBeCloseTo(161_680, 6);
    expect(depthAt(curve, 161_680)).toBeCloseTo(3270, 6);
  });

  it('weighs 157.85 t there with a density of 0.9870 × 0.9892', () => {
    const settings = settingsOf(0.987 * 0.9892 * 1000);
    const table = { curve, plusMinusL: [0, 0], heightMm: 3300, capacityL: 163_600, settings };
    const tonnes = answerAt(table, 3270).massKg / 1000;
    expect(tonnes).toBeCloseTo(157.855, 3);
    expect(Math.abs(tonnes - 157.85)).toBeLessThan(0.01);
  });
});

describe('depth and ullage of a mass', () => {
  it('400 t of 0.9 in an upright cylinder of 8 m, 10 m high: 8.842 m, ullage 1.158 m (V3.14)', async () => {
    // marinegyaan.com, Stability I, chapter 1, question 2: prints 8.8418 and 1.1582, with π rounded
    const tank = design([cylinder('c', 8000, 10_000, { axis: 'z' })]);
    const table = await looked(tank, settingsOf(900));
    const depthMm = depthAt(table.curve, 400_000 / 0.9);
    const { massKg, ullageMm } = answerAt(table, depthMm);
    expect(massKg / 1000).toBeCloseTo(400, 6);
    expect(depthMm / 1000).toBeCloseTo(400 / 0.9 / (Math.PI * 16), 6);
    expect(ullageMm / 1000).toBeCloseTo(1.15806, 5);
    expect(Math.abs(ullageMm / 1000 - 1.1582)).toBeLessThan(0.0002);
  });

  it('16 320 t of 0.8 in a box with a trunk: 0.667 m up the trunk, ullage 0.333 m (V3.15)', async () => {
    // the same, pages 6 and 7, which misprint 1620 for 16 320 t and 10 000 for 1000 m²: 21 m and 20 600 m³ with the
    // trunk of 1 m and 600 m³
    const tank = design([
      box('box', [40_000, 25_000, 20_000]),
      box('trunk', [30_000, 20_000, 1000], { at: [5000, 2500, 20_000] }),
    ]);
    const table = await looked(tank, settingsOf(800));
    expect(table.capacityL / 1000).toBeCloseTo(20_600, 6);
    const depthMm = depthAt(table.curve, 16_320_000 / 0.8);
    expect(depthMm - 20_000).toBeCloseTo(2000 / 3, 5);
    const { massKg, ullageMm } = answerAt(table, depthMm);
    expect(massKg / 1000).toBeCloseTo(16_320, 6);
    expect(ullageMm / 1000).toBeCloseTo(0.3333, 4);
  });

  it('a tank of 153 t of water takes 120 t of oil of 0.8 that may grow by 2 % of itself (V3.16)', async () => {
    // Derrett, Ship Stability for Masters and Mates, chapter 3, example 5
    const tank = design([box('box', [8500, 6000, 3000])]);
    const ofOil = await looked(tank, settingsOf(800, 100 / 1.02));
    expect(ofOil.capacityL).toBeCloseTo(153_000, 6);
    expect(safeFillL(ofOil)).toBeCloseTo(150_000, 6);
    expect(answerAt(ofOil, safeFillMm(ofOil)!).massKg).toBeCloseTo(120_000, 4);
    // 2 % of the tank, as the safe fill is told, is another agreement: 98 % leaves 119.952 t
    const ofTank = await looked(tank, settingsOf(800, 98));
    expect(answerAt(ofTank, safeFillMm(ofTank)!).massKg).toBeCloseTo(119_952, 4);
  });
});
