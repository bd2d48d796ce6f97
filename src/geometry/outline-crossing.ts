import type { Vec2 } from './shape';
import { samePlaceMm } from './tolerance';

/**
 * Two sides of a closed polygon that cross or touch each other where they should not (side i runs from corner i to
 * the next), the first such pair; null when there is none. Sides that meet in a corner fault only where one
 * runs back along the other. Touching: nearer than 2e-6 mm.
 */
export function crossingSides(corners: readonly Vec2[]): readonly [number, number] | null {
  const n = corners.length;
  const side = (i: number) => [corners[i % n]!, corners[(i + 1) % n]!] as const;
  for (let i = 0; i < n; i += 1) {
    if (runsBack(side(i), side(i + 1))) return [i, (i + 1) % n];
    for (let j = i + 2; j < n; j += 1) {
      if (i === 0 && j === n - 1) continue;
      if (meet(side(i), side(j))) return [i, j];
    }
  }
  return null;
}

type Side = readonly [Vec2, Vec2];

function runsBack([a, b]: Side, [, c]: Side): boolean {
  const onward = (b[0] - a[0]) * (c[0] - b[0]) + (b[1] - a[1]) * (c[1] - b[1]);
  return onward < 0 && (distance(a, [b, c]) < samePlaceMm || distance(c, [a, b]) < samePlaceMm);
}

function meet(one: Side, other: Side): boolean {
  if (
    turn(one, other[0]) * turn(one, other[1]) < 0 &&
    turn(other, one[0]) * turn(other, one[1]) < 0
  ) {
    return true;
  }
  return (
    other.some((point) => distance(point, one) < samePlaceMm) ||
    one.some((point) => distance(point, other) < samePlaceMm)
  );
}

function turn([a, b]: Side, p: Vec2): number {
  return (b[0] - a[0]) * (p[1] - a[1]) - (b[1] - a[1]) * (p[0] - a[0]);
}

function distance([x, y]: Vec2, [a, b]: Side): number {
  const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
  const along = ((x - a[0]) * dx + (y - a[1]) * dy) / (dx * dx + dy * dy);
  const t = Math.min(Math.max(along, 0), 1);
  return Math.hypot(x - a[0] - t * dx, y - a[1] - t * dy);
}
