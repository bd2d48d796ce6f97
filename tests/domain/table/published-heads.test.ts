import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import type { End } from '~/domain/tank/kinds/cylinder/schema';
import { cylinder, design } from './designs';

const usGallonL = 3.785411784; // 231 in³ exactly: NIST Handbook 44, appendix C
const inchMm = 25.4;

/** A cylinder in inches with two ends; readings in inches, answers in US gallons. */
async function gallons(
  [diameter, length]: readonly [number, number],
  axis: 'x' | 'z',
  ends: readonly [End, End],
  inches: readonly number[],
) {
  const tank = design([
    cylinder('c', diameter * inchMm, length * inchMm, { axis, ends: [...ends] }),
  ]);
  const table = await computeTable(tank, { atMm: inches.map((inch) => inch * inchMm) });
  return {
    ofRows: table.rows.map(({ volumeL }) => volumeL / usGallonL),
    capacity: table.capacityL / usGallonL,
    error: table.errorL / usGallonL,
  };
}

const inches = (value: number) => value * inchMm;
const flat: End = { form: 'flat' };

/*
 * D. Jones, "Calculating Tank Volume" (web article), and "Compute Fluid Volumes in Vertical Tanks", Chemical
 * Processing, 18 December 2003; read second-hand in the docstrings and tests of ChEDL fluids.geometry (C. Bell),
 * which say that they match the articles. Inches and US gallons.
 */
describe('dished heads of a lying tank: D 108 in, barrel 156 in, filled to 36 in (D. Jones)', () => {
  it.each([
    ['conical heads of 42 in (V2.01)', { form: 'cone', depth: inches(42) }, 2041.19236],
    ['ellipsoidal heads of 42 in (V2.02)', { form: 'ellipsoid', depth: inches(42) }, 2380.95654],
    ['spherical heads of 42 in (V2.03)', { form: 'dish', depth: inches(42) }, 2303.96151],
    [
      'torispherical heads, f = 1, k = 0.06 (V2.04)',
      { form: 'torisphere', crown: inches(108), knuckle: inches(0.06 * 108) },
      2028.62667,
    ],
    // the barrel alone: worked outside the project
    ['flat heads (V2.05)', flat, 1805.18829],
  ] as const)('%s', async (_, end, expected) => {
    const { ofRows, capacity, error } = await gallons([108, 156], 'x', [end, end], [36]);
    expect(Math.abs(ofRows[0]! - expected) / capacity).toBeLessThan(1e-7);
    expect(Math.abs(ofRows[0]! - expected)).toBeLessThan(error + 5e-6);
  });

  it('hold 6186.57113 US gal with flat heads (V2.05)', async () => {
    const { capacity } = await gallons([108, 156], 'x', [flat, flat], [36]);
    expect(capacity).toBeCloseTo(6186.57113, 5);
  });
});

describe('dished bottom of a standing tank: D 132 in, filled to 24 in (D. Jones)', () => {
  it.each([
    ['conical, 33 in (V2.07)', { form: 'cone', depth: inches(33) }, 250.67461],
    ['ellipsoidal, 33 in (V2.08)', { form: 'ellipsoid', depth: inches(33) }, 783.35817],
    ['spherical, 33 in (V2.09)', { form: 'dish', depth: inches(33) }, 583.60184],
    [
      'torispherical, f = 1, k = 0.06 (V2.10)',
      { form: 'torisphere', crown: inches(132), knuckle: inches(0.06 * 132) },
      904.06883,
    ],
  ] as const)('%s', async (_, end, expected) => {
    const { ofRows, capacity, error } = await gallons([132, 100], 'z', [end, flat], [24]);
    expect(Math.abs(ofRows[0]! - expected) / capacity).toBeLessThan(1e-7);
    expect(Math.abs(ofRows[0]! - expected)).toBeLessThan(error + 5e-6);
  });
});

describe('bottom pushed inwards by 33 in, D 113 in, filled to 15, 25, 50 in (D. Jones 2003)', () => {
  it.each([
    ['cone (V2.11)', 'cone', [251.15826, 614.60684, 1693.16544]],
    ['ellipsoid (V2.12)', 'ellipsoid', [44.84969, 207.63745, 1215.60596]],
    ['sphere (V2.13)', 'dish', [112.81405, 341.70564, 1372.92869]],
  ] as const)('%s', async (_, form, expected) => {
    const pushed = { form, depth: inches(33), inward: true } as const;
    const { ofRows, capacity, error } = await gallons([113, 60], 'z', [pushed, flat], [15, 25, 50]);
    ofRows.forEach((found, i) => {
      expect(Math.abs(found - expected[i]!) / capacity).toBeLessThan(1.5e-7);
      expect(Math.abs(found - expected[i]!)).toBeLessThan(error + 5e-6);
    });
  });
});

describe('whole heads', () => {
  const diameter = 1000;
  const headOverCube = async (end: End) => {
    const barrel = 400;
    const { capacityL } = await computeTable(
      design([cylinder('c', diameter, barrel, { ends: [end, flat] })]),
      { atMm: [0] },
    );
    return (capacityL * 1e6 - (Math.PI / 4) * diameter ** 2 * barrel) / diameter ** 3;
  };

  // D. R. and R. B. Crookston, "Calculate Liquid Volumes in Tanks with Dished Heads", Chemical Engineering,
  // September 2011, parameter table (the constants are from memory; they agree with the closed form)
  it.each([
    ['ASME flanged and dished', 1, 0.06, 0.080999],
    ['80/10', 0.8, 0.1, 0.109884],
    ['2:1 as two arcs', 0.875, 0.17, 0.1337164],
  ] as const)('%s: crown %s D, knuckle %s D, holds %s D³ (V2.14)', async (_, f, k, share) => {
    const end = { form: 'torisphere', crown: f * diameter, knuckle: k * diameter } as const;
    expect(await headOverCube(end)).toBeCloseTo(share, 7);
  });

  it('of a true 2:1 ellipsoid hold π D³/24, half of a hemisphere (V2.15)', async () => {
    // G. Montemayor, Vessel Design Tips, revision 2 (2003), item 3
    const ellipsoid = await headOverCube({ form: 'ellipsoid', depth: diameter / 4 });
    expect(ellipsoid).toBeCloseTo(Math.PI / 24, 9);
    const hemisphere = await headOverCube({ form: 'dish', depth: diameter / 2 });
    expect(ellipsoid / hemisphere).toBeCloseTo(0.5, 9);
  });
});

describe('a real tank with spherical ends', () => {
  it('reads as its level table says (V2.16)', async () => {
    // CUMCM (China undergraduate mathematical contest in modelling) 2010, problem A, annex 2, columns displayed
    // height and displayed volume: R 1.5 m, barrel 8 m, ends 1 m deep. mm, L
    const shown: readonly (readonly [number, number])[] = [
      [2632.23, 60448.88],
      [2374.35, 55334.9],
      [2100.32, 48779.99],
      [1818.96, 41286.7],
      [1581.14, 34629.99],
      [1348.78, 28056.19],
      [1092.63, 20963.48],
      [842.18, 14435.27],
      [597.55, 8714.85],
    ];
    const end = { form: 'dish', depth: 1000 } as const;
    const table = await computeTable(design([cylinder('tank', 3000, 8000, { ends: [end, end] })]), {
      atMm: shown.map(([height]) => height),
    });
    expect(table.capacityL).toBeCloseTo(64664.449, 3);
    // heights are shown to 0.01 mm and the surface is at most 30 m²: the table of 603 rows fits within 0.04 L
    table.rows.forEach(({ volumeL }, i) => {
      expect(Math.abs(volumeL - shown[i]![1])).toBeLessThan(0.04);
    });
  });
});

describe('a cylinder 500 × 1000 lying down', () => {
  const at = [125, 225.7, 250, 450, 500];

  it('with 2:1 elliptical ends, 1250 from tip to tip', async () => {
    const end = { form: 'ellipsoid', depth: 125 } as const;
    const tank = design([cylinder('c', 500, 1000, { ends: [end, end] })]);
    const { rows, capacityL } = await computeTable(tank, { atMm: at });
    // the barrel's circular segment and (125/250)·πh²(3R − h)/3 for both ends
    const R = 250;
    const closed = (h: number) =>
      1000 * (R * R * Math.acos((R - h) / R) - (R - h) * Math.sqrt(2 * R * h - h * h)) +
      (0.5 * Math.PI * h * h * (3 * R - h)) / 3;
    rows.forEach(({ volumeL }, i) => {
      expect(Math.abs(volumeL - closed(at[i]!) / 1e6) / capacityL).toBeLessThan(1e-7);
    });
    const litres = rows.map(({ volumeL }) => volumeL);
    expect(litres[0]).toBeCloseTo(43.5, 2);
    expect(litres[1]).toBeCloseTo(100, 1);
    expect(litres[2]).toBeCloseTo(114.54, 2);
    expect(litres[3]).toBeCloseTo(217.94, 2);
    expect(capacityL).toBeCloseTo(229.07, 2);
  });

  it('with torispherical ends, crown 500, knuckle 50', async () => {
    const end = { form: 'torisphere', crown: 500, knuckle: 50 } as const;
    const tank = design([cylinder('c', 500, 1000, { ends: [end, end] })]);
    const { rows, capacityL } = await computeTable(tank, { atMm: at });
    // worked by hand and checked by slices
    expect(rows[0]!.volumeL).toBeCloseTo(42.26, 2);
    expect(rows[2]!.volumeL).toBeCloseTo(110.55, 2);
    expect(capacityL).toBeCloseTo(221.09, 2);
    expect((capacityL - 62.5 * Math.PI) / 2).toBeCloseTo(12.37, 2);
  });
});
