import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import { plusMinusOfTable } from '~/domain/table/uncertainty';
import type { Solid } from '~/domain/tank/kinds/registry';
import { box, design } from '../table/designs';

/** ± of the whole tank, litres, when every size is known to ± `mm` and a dip is exact. */
async function brimPlusMinus(solid: Solid, mm = 1): Promise<number> {
  const tank = design([solid]);
  const table = await computeTable(tank, { stepMm: 50 });
  const measured = { sizePlusMinusMm: mm, dipPlusMinusMm: 0 };
  return (await plusMinusOfTable(tank, measured, table)).brimL;
}

const litres = (...mm3: number[]) => Math.hypot(...mm3) / 1e6;
const fields = { id: 'it', role: 'holds' } as const;

describe('the ± of sizes goes over each place of an outline', () => {
  const corners: [number, number][] = [
    [0, 0],
    [400, 0],
    [400, 300],
    [0, 300],
  ];

  it('a prism: moving a corner changes the area by half of the span of its neighbours, also where it stands at 0', async () => {
    const prism: Solid = { ...fields, kind: 'prism', profile: corners, width: 100 };
    const byX = Array.from({ length: 4 }, () => (300 * 100) / 2);
    const byZ = Array.from({ length: 4 }, () => (400 * 100) / 2);
    expect((await brimPlusMinus(prism)) / litres(...byX, ...byZ, 400 * 300)).toBeCloseTo(1, 2);
  });

  it('a prism whose radius is the greatest that fits: made smaller instead', async () => {
    const profile = corners.map(([x, z]): [number, number, number] => [x, z, 150]);
    const round: Solid = { ...fields, kind: 'prism', profile, width: 100 };
    const whole = (await brimPlusMinus(round, 0.5)) / 0.5;
    const byRadius = (4 - Math.PI) * 2 * 150 * 100;
    expect(whole).toBeGreaterThan(litres(byRadius / 4));
    expect(whole).toBeLessThan(litres(400 * 300, 4 * 300 * 100, 4 * 400 * 100));
  });

  it('stations: a corner of one end moves a quarter of what it would along the whole', async () => {
    const hull: Solid = {
      ...fields,
      kind: 'stations',
      stations: [
        { x: 0, profile: corners },
        { x: 1000, profile: corners },
      ],
    };
    const byY = Array.from({ length: 8 }, () => (1000 * 300) / 4);
    const byZ = Array.from({ length: 8 }, () => (1000 * 400) / 4);
    const expected = litres(...byY, ...byZ, 400 * 300, 400 * 300);
    expect((await brimPlusMinus(hull)) / expected).toBeCloseTo(1, 2);
  });

  it('a taper: dV by the prismatoid rule; its shift moves nothing', async () => {
    const taper: Solid = {
      ...fields,
      kind: 'taper',
      bottom: [200, 200],
      top: [400, 400],
      height: 600,
      shift: [0, 0],
    };
    const expected = litres(
      ...[1, 2].map(() => (600 / 6) * (200 + 2 * 300)),
      ...[1, 2].map(() => (600 / 6) * (400 + 2 * 300)),
      (200 ** 2 + 4 * 300 ** 2 + 400 ** 2) / 6,
    );
    expect((await brimPlusMinus(taper)) / expected).toBeCloseTo(1, 2);
  });

  it('a box: equal radii of its edges are one length', async () => {
    const [a, b, c, r] = [600, 400, 300, 60];
    const rounded = box('b', [a, b, c], { edges: { x: r, y: r, z: r } });
    const volume = (x: number, y: number, z: number, q: number) => {
      const [l, w, h] = [x - 2 * q, y - 2 * q, z - 2 * q];
      return (
        l * w * h +
        2 * q * (l * w + w * h + h * l) +
        Math.PI * q * q * (l + w + h) +
        (4 / 3) * Math.PI * q ** 3
      );
    };
    const changes = [
      [1, 0, 0, 0],
      [0, 1, 0, 0],
      [0, 0, 1, 0],
      [0, 0, 0, 1],
    ].map(([x, y, z, q]) => volume(a + x!, b + y!, c + z!, r + q!) - volume(a, b, c, r));
    expect((await brimPlusMinus(rounded)) / litres(...changes)).toBeCloseTo(1, 2);
  });
});
