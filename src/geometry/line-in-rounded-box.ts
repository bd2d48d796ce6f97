import type { Interval } from './intervals';
import type { Line } from './line';
import { roundedBoxDistance, type RoundedBox } from './rounded-box';
import { along, dot } from './vec3';

/** Deeper inside than this, a line crosses the box; less deep, it lies in its surface. mm */
const inSurfaceMm = 1e-9;

/**
 * The stretch of a line inside a rounded box, its surface included within `slack` mm; null when the line misses it.
 * The distance from the box is convex along the line: its least is sought in thirds, then its zeros on either side
 * by halving, to rounding.
 */
export function lineInRoundedBox(line: Line, box: RoundedBox, slack: number): Interval | null {
  const distance = (t: number) => roundedBoxDistance(box, along(line.origin, line.direction, t));
  const middle = -dot(line.origin, line.direction);
  const reach = Math.hypot(...box.size);
  const deepest = leastOf(distance, middle - reach, middle + reach);
  const depth = distance(deepest);
  if (depth > slack) return null;
  // a line in the surface is followed as far as it stays where it is
  const level = depth < -inSurfaceMm ? 0 : depth + inSurfaceMm;
  const end = (far: number) => {
    let [inside, outside] = [deepest, far];
    for (let turn = 0; turn < 80; turn += 1) {
      const between = (inside + outside) / 2;
      if (distance(between) <= level) inside = between;
      else outside = between;
    }
    return inside;
  };
  return { from: end(middle - reach), to: end(middle + reach) };
}

/** Where a convex function is least between two places, by thirds. */
function leastOf(f: (t: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let turn = 0; turn < 100; turn += 1) {
    const [one, other] = [low + (high - low) / 3, high - (high - low) / 3];
    if (f(one) <= f(other)) high = other;
    else low = one;
  }
  return (low + high) / 2;
}
