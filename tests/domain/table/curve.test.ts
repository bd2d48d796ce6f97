import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import { curveFromRows, depthAt, volumeAt } from '~/domain/table/curve';
import { startingPoints } from '~/domain/tank/starting-points';
import { box, cylinder, design, slopedCistern } from './designs';

const between = [0.3, 17.3, 59.2, 118.8, 205, 209.9, 214, 260.5, 297.7];

async function worst(
  tank: Parameters<typeof computeTable>[0],
  stepMm: number,
  depths: readonly number[],
) {
  const { rows, capacityL } = await computeTable(tank, { stepMm });
  const exact = await computeTable(tank, { atMm: depths });
  const curve = curveFromRows(rows);
  const gaps = exact.rows.map(({ depthMm, volumeL }) =>
    Math.abs(volumeAt(curve, depthMm) - volumeL),
  );
  return Math.max(...gaps) / capacityL;
}

describe('the curve through a table', () => {
  it('is exact where sides are flat', async () => {
    expect(await worst(slopedCistern, 10, between)).toBeLessThan(1e-12);
  });

  it('keeps to both sides of a flat step, at a row or between two', async () => {
    const arch = startingPoints.find(({ code }) => code === 'wheel-arch')!.design;
    // the arch ends at 210 mm: on a row at 10 mm
    expect(await worst(arch, 10, between)).toBeLessThan(1e-12);
    // with its top inside a segment nothing can tell where it is: at most a quarter of the jump times the step
    expect(await worst(arch, 20, [209.9])).toBeLessThan(0.01);
    const ledge = design([
      box('low', [400, 400, 100]),
      box('high', [200, 400, 100], { at: [0, 0, 100] }),
    ]);
    expect(await worst(ledge, 10, [95, 99, 101, 105, 150])).toBeLessThan(1e-12);
  });

  it('goes back from litres to depth', async () => {
    const { rows } = await computeTable(slopedCistern, { stepMm: 10 });
    const curve = curveFromRows(rows);
    for (const depth of between)
      expect(depthAt(curve, volumeAt(curve, depth))).toBeCloseTo(depth, 7);
    expect(depthAt(curve, 55.5)).toBeCloseTo(150, 7);
  });

  it('is good to 1e-6 on a lying cylinder at 5 mm', async () => {
    const tank = design([cylinder('c', 500, 1000)]);
    expect(await worst(tank, 5, [40, 111.1, 222.2, 333.3, 444.4])).toBeLessThan(1e-6);
    // between the tangent floor and the first row the volume grows as h to the power 3/2
    expect(await worst(tank, 5, [2.5])).toBeLessThan(1e-4);
  });

  it('refuses what lies outside, with the range', async () => {
    const { rows } = await computeTable(slopedCistern, { stepMm: 10 });
    const curve = curveFromRows(rows);
    expect(() => volumeAt(curve, 300.1)).toThrow(/from 0 to 300 mm/);
    expect(() => volumeAt(curve, Number.NaN)).toThrow(/from 0 to 300 mm/);
    expect(() => depthAt(curve, 124)).toThrow(/from 0 to 123 L/);
  });
});
