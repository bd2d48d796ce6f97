import { expect, it } from 'vitest';
import { polygonArea } from '~/geometry/outline-area';
import type { Vec2 } from '~/geometry/shape';
import { unitedOutline } from '~/geometry/united-outline';

const sides = (loop: readonly Vec2[]) =>
  loop.map((a, i) => [a, loop[(i + 1) % loop.length]!] as const);
const square = (x: number, y: number, size: number): Vec2[] => [
  [x, y],
  [x + size, y],
  [x + size, y + size],
  [x, y + size],
];
const area = (loops: readonly Vec2[][]) => loops.reduce((sum, loop) => sum + polygonArea(loop), 0);

it('unites squares that cross: eight corners, their areas less the common one', () => {
  const loops = unitedOutline([...sides(square(0, 0, 10)), ...sides(square(5, 5, 10))]);
  expect(loops).toHaveLength(1);
  expect(loops[0]).toHaveLength(8);
  expect(area(loops)).toBeCloseTo(100 + 100 - 25, 3);
});

it('unites squares that share a side, and leaves no line between them', () => {
  const loops = unitedOutline([...sides(square(0, 0, 10)), ...sides(square(10, 0, 10))]);
  expect(loops).toHaveLength(1);
  expect(loops[0]).toHaveLength(4);
  expect(area(loops)).toBeCloseTo(200, 3);
});

it('leaves out what lies inside, and keeps a hole', () => {
  expect(unitedOutline([...sides(square(0, 0, 10)), ...sides(square(2, 2, 3))])).toHaveLength(1);
  const hole = [...square(2, 2, 3)].reverse();
  const ring = unitedOutline([...sides(square(0, 0, 10)), ...sides(hole)]);
  expect(ring).toHaveLength(2);
  expect(area(ring)).toBeCloseTo(91, 3);
});

it('of nothing is nothing', () => {
  expect(unitedOutline([])).toEqual([]);
});
