import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import type { Solid } from '~/domain/tank/kinds/registry';
import { cylinder, design, wedge } from './designs';

const usGallonL = 3.785411784; // 231 in³ exactly: NIST Handbook 44, appendix C (V7.01)
const imperialGallonL = 4.54609; // Weights and Measures Act 1985, schedule 1, part IV (V7.02)
const inchMm = 25.4; // international yard and pound agreement, 1959 (V7.03)

describe('units by which published volumes are compared', () => {
  it('follow from the inch (V7.01, V7.03)', () => {
    expect(231 * (inchMm / 100) ** 3).toBeCloseTo(usGallonL, 12);
    expect(imperialGallonL / usGallonL).toBeCloseTo(1.2009499, 7);
  });
});

describe('horizontal cylinder, part filled', () => {
  // Perry's Chemical Engineers' Handbook, section 10, "Volume of partially filled horizontal cylinders"
  // (the citation is from memory; the values agree with the closed form)
  const perry: readonly (readonly [number, number])[] = [
    [0.05, 0.018693],
    [0.1, 0.052044],
    [0.2, 0.142378],
    [0.25, 0.195501],
    [0.3, 0.252316],
    [0.4, 0.37353],
    [0.5, 0.5],
    [0.6, 0.62647],
    [0.75, 0.804499],
    [0.9, 0.947956],
  ];

  it('gives the tabulated fractions (V1.01)', async () => {
    const table = await computeTable(design([cylinder('c', 1000, 2000)]), {
      atMm: perry.map(([share]) => share * 1000),
    });
    table.rows.forEach(({ volumeL }, i) => {
      expect(Math.abs(volumeL / table.capacityL - perry[i]![1])).toBeLessThan(6e-7);
    });
  });

  it("gives Machinery's Handbook's tank of 20 ft by 6 ft (V1.02)", async () => {
    // 31st edition, p. 74: full 4230 US gal (rounded), the 1000 gallon mark at 36 × 0.5724 = 20.61 in
    const inches = 20.6113;
    const table = await computeTable(design([cylinder('c', 72 * inchMm, 240 * inchMm)]), {
      atMm: [inches * inchMm],
    });
    expect(table.capacityL / usGallonL).toBeCloseTo(4230.134, 3);
    expect(table.rows[0]!.volumeL / usGallonL).toBeCloseTo(1000, 1);
  });

  it('is a quarter full at h/R = 0.596027 (V1.03)', async () => {
    // MathWorld "Quarter-Tank Problem"; OEIS A133742
    const table = await computeTable(design([cylinder('c', 2000, 1000)]), { atMm: [596.0272467] });
    expect(table.rows[0]!.volumeL / table.capacityL).toBeCloseTo(0.25, 7);
  });
});

describe('cylindrical wedge', () => {
  it('holds (2/3) r² h over half its base: r = 2 in, h = 10 in → 26 2/3 in³ (V3.07)', async () => {
    // math.techqa 3279465; vias.org "Cylindrical Wedge". A cylinder leaning so that the surface runs from a
    // diameter of its floor to a height h on its wall holds just that wedge.
    const r = 2 * inchMm;
    const h = 10 * inchMm;
    const lean = Math.atan(h / r);
    const tank = design([
      cylinder('c', 2 * r, 12 * inchMm, { axis: 'z', turn: [0, (lean * 180) / Math.PI, 0] }),
    ]);
    const table = await computeTable(tank, { atMm: [r * Math.sin(lean)] });
    const cubicInches = table.rows[0]!.volumeL / (inchMm / 100) ** 3;
    expect(Math.abs(cubicInches - (26 + 2 / 3))).toBeLessThan(1e-5);
  });
});

describe('wedge', () => {
  it('is half its box', async () => {
    const table = await computeTable(design([wedge('w', [800, 500, 60])]), { atMm: [30, 60] });
    expect(table.capacityL).toBeCloseTo(12, 12);
    expect(table.rows[0]!.volumeL).toBeCloseTo(9, 12);
  });
});

describe('ball', () => {
  // fraction = x²(3 − 2x) at x = h/H, for a sphere or any ellipsoid with one axis upright: spherical cap,
  // MathWorld "Spherical Cap"
  const fractions: readonly (readonly [number, number])[] = [
    [0.1, 0.028],
    [0.25, 0.15625],
    [0.3, 0.216],
    [0.6, 0.648],
    [0.75, 0.84375],
  ];

  it.each<[string, Solid, number]>([
    ['sphere', { id: 's', role: 'holds', kind: 'sphere', diameter: 1200 }, 1200],
    [
      'ellipsoid',
      { id: 'e', role: 'holds', kind: 'ellipsoid', length: 1500, width: 900, height: 600 },
      600,
    ],
    [
      'turned ellipsoid',
      {
        id: 'e',
        role: 'holds',
        kind: 'ellipsoid',
        length: 1500,
        width: 900,
        height: 600,
        turn: [0, 90, 30],
      },
      1500,
    ],
  ])('gives the fractions of a %s (V1.05)', async (_, solid, heightMm) => {
    const table = await computeTable(design([solid]), {
      atMm: fractions.map(([share]) => share * heightMm),
    });
    expect(table.heightMm).toBeCloseTo(heightMm, 9);
    table.rows.forEach(({ volumeL }, i) => {
      const gap = Math.abs(volumeL / table.capacityL - fractions[i]![1]);
      expect(gap).toBeLessThan(2e-7);
      expect(gap * table.capacityL).toBeLessThan(table.errorL);
    });
  });

  it('of radius 6 cm holds 837.76 cm³ at 10 cm and 670.21 at 8 (V3.04)', async () => {
    // algebra.com, question 1189056
    const { rows } = await computeTable(
      design([{ id: 's', role: 'holds', kind: 'sphere', diameter: 120 }]),
      { atMm: [80, 100] },
    );
    expect(Math.abs(rows[0]!.volumeL * 1000 - 670.21)).toBeLessThan(0.005);
    expect(Math.abs(rows[1]!.volumeL * 1000 - 837.76)).toBeLessThan(0.005);
  });
});

describe('cone', () => {
  it('frustum 24 high with radii 21 and 14 cm holds 23 398.58 cm³ (V3.03, with exact π)', async () => {
    // NCERT-style exercise, esaral.com q.97245, prints 23 408 with π = 22/7
    const bucket: Solid = {
      id: 'b',
      role: 'holds',
      kind: 'cone',
      start: 280,
      end: 420,
      length: 240,
    };
    const { capacityL } = await computeTable(design([bucket]), { stepMm: 100 });
    expect(capacityL * 1000).toBeCloseTo(23_398.58, 2);
    expect((capacityL * 1000 * (22 / 7)) / Math.PI).toBeCloseTo(23_408, 0);
  });

  it('apex down, 4 m by 12 m, holds π·125/27 m³ at 5 m (V3.06, corrected: the page prints it wrong)', async () => {
    // jiskha.com q.22584 gives 161.16; the closed form is 14.5444
    const funnel: Solid = {
      id: 'f',
      role: 'holds',
      kind: 'cone',
      start: 0,
      end: 8000,
      length: 12_000,
    };
    const { rows, capacityL } = await computeTable(design([funnel]), { atMm: [5000] });
    expect(rows[0]!.volumeL / 1000).toBeCloseTo((Math.PI * 125) / 27, 6);
    expect(capacityL / 1000).toBeCloseTo(201.062, 3);
  });
});
