import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
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
