import { describe, expect, it } from 'vitest';
import { sketchDesign } from '~/domain/report/sketch-design';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computeTable } from '~/domain/table/compute-table';
import type { End } from '~/domain/tank/kinds/cylinder/schema';
import { parseDesign } from '~/domain/tank/parse-design';
import { cylinder, design } from '../table/designs';

/*
 * Ends at the edge of what can be drawn. Volumes of a single end, mm³: cone π R² d/3; half a spheroid 2π R² d/3; cap
 * of a sphere π d (3 R² + d²)/6.
 */
const R = 250;
const disc = Math.PI * R ** 2;
const cap = (d: number) => (Math.PI * d * (3 * R ** 2 + d ** 2)) / 6;

/** A torisphere as rings 2π r h dr over crown and knuckle, by the midpoint rule in the angle of each arc. */
function torisphere(crown: number, k: number): number {
  const joint = Math.asin((R - k) / (crown - k));
  const ofArc = (from: number, to: number, ring: (angle: number) => number) => {
    const parts = 20_000;
    const step = (to - from) / parts;
    let sum = 0;
    for (let i = 0; i < parts; i += 1) sum += ring(from + (i + 0.5) * step) * step;
    return sum;
  };
  const base = Math.cos(joint) * (crown - k);
  const overCrown = ofArc(0, joint, (t) => {
    const h = crown * Math.cos(t) - base;
    return 2 * Math.PI * crown * Math.sin(t) * h * crown * Math.cos(t);
  });
  const overKnuckle = ofArc(joint, Math.PI / 2, (t) => {
    const r = R - k + k * Math.sin(t);
    return 2 * Math.PI * r * (k * Math.cos(t)) ** 2;
  });
  return overCrown + overKnuckle;
}

const hostile: readonly (readonly [string, End, number, barrelMm: number])[] = [
  ['a needle of a cone, 100 m on 500 mm', { form: 'cone', depth: 100_000 }, (disc * 1e5) / 3, 1000],
  [
    'a needle of a spheroid, 20 m deep',
    { form: 'ellipsoid', depth: 20_000 },
    (2 * disc * 20_000) / 3,
    1000,
  ],
  [
    'a needle of a spheroid, 100 m deep',
    { form: 'ellipsoid', depth: 100_000 },
    (2 * disc * 1e5) / 3,
    1000,
  ],
  [
    'a spheroid 0.01 mm deep on a barrel of 100 m',
    { form: 'ellipsoid', depth: 0.01 },
    (2 * disc * 0.01) / 3,
    1e5,
  ],
  [
    'a cone 0.01 mm deep on a barrel of 100 m',
    { form: 'cone', depth: 0.01 },
    (disc * 0.01) / 3,
    1e5,
  ],
  ['a thin bowl of a dish, 0.01 mm deep', { form: 'dish', depth: 0.01 }, cap(0.01), 1000],
  ['a thin bowl turned inward', { form: 'dish', depth: 0.01, inward: true }, -cap(0.01), 1000],
  ['half a ball', { form: 'dish', depth: R }, cap(R), 1000],
  [
    'a crown and knuckle that make half a ball',
    { form: 'torisphere', crown: R, knuckle: R - 0.01 },
    torisphere(R, R - 0.01),
    1000,
  ],
  [
    'a crown of 100 m and a knuckle of 50',
    { form: 'torisphere', crown: 100_000, knuckle: 50 },
    torisphere(100_000, 50),
    1000,
  ],
  [
    'a crown of 100 m and a knuckle of 0.01 mm',
    { form: 'torisphere', crown: 100_000, knuckle: 0.01 },
    torisphere(100_000, 0.01),
    1000,
  ],
];

/** How far an end stands out; by its own sizes. */
function depthOf(end: End): number {
  if (end.form === 'flat' || ('inward' in end && end.inward)) return 0;
  if (end.form !== 'torisphere') return end.depth;
  const { crown, knuckle: k } = end;
  return crown - Math.sqrt((crown - k) ** 2 - (R - k) ** 2);
}

const tankWith = (end: End, barrelMm: number) =>
  parseDesign(
    design([cylinder('c', 2 * R, barrelMm, { axis: 'z', ends: [{ form: 'flat' }, end] })]),
  );

describe('ends at the edge of what can be drawn', { timeout: 60_000 }, () => {
  it.each(hostile)('%s: its closed form, within five seconds', async (_, end, volume, barrelMm) => {
    const before = process.cpuUsage();
    const table = await computeTable(tankWith(end, barrelMm), { stepMm: 1000 });
    const { user, system } = process.cpuUsage(before);
    const expectedL = (disc * barrelMm + volume) / 1e6;
    expect(Math.abs(table.capacityL / expectedL - 1)).toBeLessThan(2e-8);
    expect(table.errorL / table.capacityL).toBeLessThan(1e-5);
    expect((user + system) / 1000).toBeLessThan(5000);
    table.rows.forEach(({ volumeL, surfaceCm2, centroidMm }, i) => {
      expect([volumeL, surfaceCm2, ...centroidMm].every(Number.isFinite)).toBe(true);
      if (i > 0) expect(volumeL).toBeGreaterThanOrEqual(table.rows[i - 1]!.volumeL);
    });
    expect(table.rows.at(-1)!.volumeL).toBeCloseTo(table.capacityL, 9);
  });

  it.each(hostile)('%s: may be issued and drawn', async (_, end, _volume, barrelMm) => {
    const tank = tankWith(end, barrelMm);
    expect(await checkIssuable(tank)).toEqual([]);
    const sketch = await sketchDesign(tank);
    expect(sketch.lines.length).toBeGreaterThan(0);
    for (const { x1, y1, x2, y2 } of sketch.lines) {
      expect([x1, y1, x2, y2].every(Number.isFinite)).toBe(true);
    }
    expect(sketch.heightMm).toBeCloseTo(barrelMm + depthOf(end), 2);
  });
});
