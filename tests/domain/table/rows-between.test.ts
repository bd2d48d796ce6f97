import { describe, expect, it } from 'vitest';
import { loadManifold } from '~/geometry/manifold';
import { curveFromRows, depthAt, volumeAt } from '~/domain/table/curve';
import { levelOfReading } from '~/domain/table/level';
import { computeInFull } from '~/domain/table/compute-in-full';
import type { TableRow } from '~/domain/table/request';
import { rowsBetween } from '~/domain/table/rows-between';
import { tableRows } from '~/domain/table/table-rows';
import type { TankDocument } from '~/domain/tank/document';
import type { Solid } from '~/domain/tank/kinds/registry';
import { startingPoints } from '~/domain/tank/starting-points';
import { box, cylinder, design, hull, slopedCistern, wedge } from './designs';

await loadManifold();

/** A table with its closer rows, and how far its curve is off the exact sweep, as part of the capacity. */
async function refined(tank: TankDocument, stepMm: number) {
  const { table, space, frame } = await computeInFull(tank, { stepMm });
  const between = rowsBetween(space, frame, table.rows);
  const rows = [...table.rows, ...between].sort((a, b) => a.depthMm - b.depthMm);
  const curve = curveFromRows(rows, frame.levelPerReading);
  const { heightMm, capacityL } = table;
  // evenly, and ever closer to either end
  const even = Array.from({ length: 6007 }, (_, i) => ((i + 0.37) / 6007) * heightMm);
  const ends = Array.from({ length: 400 }, (_, i) => heightMm * 10 ** (-6 + (5 * i) / 400));
  const readings = [...even, ...ends, ...ends.map((mm) => heightMm - mm)];
  const exact = tableRows(space, frame, readings);
  const plain = curveFromRows(table.rows, frame.levelPerReading);
  const worst = (litresAt: (row: TableRow, i: number) => number) =>
    exact.reduce(
      (most, row, i) => Math.max(most, Math.abs(litresAt(row, i) - row.volumeL) / capacityL),
      0,
    );
  const miss = worst(({ depthMm }) => volumeAt(curve, depthMm));
  const missWithout = worst(({ depthMm }) => volumeAt(plain, depthMm));
  // the litres that the exact sweep puts at the reading found for given litres
  const found = exact.map(({ volumeL }) => depthAt(curve, volumeL));
  const back = tableRows(space, frame, found);
  const missBack = worst((_, i) => back[i]!.volumeL);
  return { table, between, curve, miss, missBack, missWithout, frame };
}

const ofKind = (solid: Record<string, unknown>) =>
  ({ role: 'holds', ...solid }) as unknown as Solid;
const arch = startingPoints.find(({ code }) => code === 'wheel-arch')!.design;
const tilted = { attitude: { pitch: 7, roll: 4 } };

const tanks: [string, TankDocument, number][] = [
  ['lying cylinder', design([cylinder('c', 500, 1000)]), 5],
  ['lying cylinder, rows 100 mm apart', design([cylinder('c', 500, 1000)]), 100],
  [
    'lying cylinder, tilted by 3°',
    design([cylinder('c', 500, 1000)], {
      attitude: { pitch: 3, roll: 0 },
      stick: { at: [500, 250] },
    }),
    5,
  ],
  ['oval', design([ofKind({ id: 'o', kind: 'oval', length: 900, width: 500, height: 300 })]), 5],
  ['sphere', design([ofKind({ id: 's', kind: 'sphere', diameter: 600 })]), 10],
  [
    'cone on its tip',
    design([ofKind({ id: 'o', kind: 'cone', start: 0, end: 500, length: 300, axis: 'z' })]),
    10,
  ],
  [
    'lying cone',
    design([ofKind({ id: 'o', kind: 'cone', start: 200, end: 500, length: 800, axis: 'x' })]),
    5,
  ],
  [
    'lying cylinder with dished ends',
    design([
      {
        ...cylinder('c', 500, 900),
        ends: [
          { form: 'ellipsoid', depth: 125 },
          { form: 'torisphere', crown: 500, knuckle: 50 },
        ],
      } as Solid,
    ]),
    5,
  ],
  ['tilted box', design([box('b', [900, 500, 300])], tilted), 5],
  [
    'tilted box with a stick',
    design([box('b', [900, 500, 300])], { ...tilted, stick: { at: [200, 100] } }),
    10,
  ],
  ['V hull', hull, 10],
  ['wheel arch with its top between two rows', arch, 20],
  ['sloped floor that ends between two rows', slopedCistern, 7],
  ['wedge', design([wedge('w', [800, 500, 300])]), 7],
  [
    'round tank over a box whose top lies between two rows',
    design([
      cylinder('c', 500, 1000),
      box('b', [300, 300, 103.3], { role: 'displaces', at: [300, 100, -1] } as Partial<Solid>),
    ]),
    5,
  ],
  [
    'tilted floor of a hundredth of a degree',
    design([
      box('b', [900, 500, 300]),
      box('step', [400, 500, 100], {
        role: 'displaces',
        turn: [0, 0.01, 0],
        at: [-10, 0, 0],
      } as Partial<Solid>),
    ]),
    20,
  ],
  [
    'stick whose zero lies below the floor',
    design([box('b', [900, 500, 300], { at: [0, 0, 100] } as Partial<Solid>)], {
      stick: { at: [50, 250], zero: 53 },
    }),
    10,
  ],
];

describe('with its closer rows a table is within 1e-6 of capacity everywhere', () => {
  it.each(tanks)('%s', async (_, tank, stepMm) => {
    const { table, between, miss, missBack, missWithout } = await refined(tank, stepMm);
    expect(miss).toBeLessThan(1e-6);
    expect(missBack).toBeLessThan(1e-6);
    // rows that are not needed are not kept
    if (missWithout < 2e-7) expect(between.length).toBeLessThan(4);
    const asked = new Set(table.rows.map(({ depthMm }) => depthMm));
    between.forEach(({ depthMm }, i) => {
      expect(asked.has(depthMm)).toBe(false);
      expect(depthMm).toBeGreaterThan(i === 0 ? 0 : between[i - 1]!.depthMm);
      expect(depthMm).toBeLessThan(table.heightMm);
    });
  });
});

describe('closer rows', () => {
  it('are few: well under 20 on a lying cylinder at 5 mm, at its floor and its roof', async () => {
    const { between, missWithout } = await refined(design([cylinder('c', 500, 1000)]), 5);
    expect(missWithout).toBeGreaterThan(5e-5);
    expect(between.length).toBeGreaterThan(4);
    expect(between.length).toBeLessThan(17);
    for (const { depthMm } of between) expect(Math.min(depthMm, 500 - depthMm)).toBeLessThan(15);
  });

  it('follow the closed form in the first segment over a tangent floor', async () => {
    const { curve, table } = await refined(design([cylinder('c', 500, 1000)]), 5);
    // segment of a circle: r² acos((r−h)/r) − (r−h) √(2rh−h²)
    for (const h of [0.05, 0.3, 1, 2.5, 4.4]) {
      const exact = 62_500 * Math.acos((250 - h) / 250) - (250 - h) * Math.sqrt(500 * h - h * h);
      expect(Math.abs(volumeAt(curve, h) - exact / 1000) / table.capacityL).toBeLessThan(1e-6);
    }
  });

  it('stand exactly at a level face, so that both sides of the step are right', async () => {
    const { between, miss } = await refined(arch, 20);
    expect(between.map(({ depthMm }) => depthMm)).toEqual([210]);
    expect(miss).toBeLessThan(1e-12);
  });

  it('stand at the level of a corner where walls are flat', async () => {
    const { between, miss, frame } = await refined(slopedCistern, 7);
    expect(between.map(({ depthMm }) => depthMm)).toEqual([60]);
    expect(levelOfReading(frame, 60)).toBe(60);
    expect(miss).toBeLessThan(1e-12);
  });

  it('are none in a box, and none where rows are close enough', async () => {
    expect((await refined(design([box('b', [900, 500, 300])]), 50)).between).toEqual([]);
    expect((await refined(hull, 10)).between).toEqual([]);
  });

  it.each([1e-3, 1e3])('are the same in a tank × %s', async (scale) => {
    const size = (times: number) => design([cylinder('c', 500 * times, 1000 * times)]);
    const { between, miss } = await refined(size(scale), 20 * scale);
    const plain = await refined(size(1), 20);
    expect(miss).toBeLessThan(1e-6);
    expect(Math.abs(between.length - plain.between.length)).toBeLessThan(3);
  });
});
