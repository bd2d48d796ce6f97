import type { Interval } from './intervals';
import type { Line } from './line';
import { axisOrder, type Axis } from './shape';

/** Longer than any line inside a document's bounds. mm */
const farMm = 1e7;

/**
 * The stretch of a line inside a frustum of a cone centred on the origin, radii `start` and `end` at the low
 * and the high end of its axis, its surface included within `slack` mm; null when the line misses it.
 */
export function lineInFrustum(
  line: Line,
  frustum: { axis: Axis; start: number; end: number; length: number },
  slack: number,
): Interval | null {
  const { axis, length } = frustum;
  const [first, second, third] = axisOrder(axis);
  const [ox, oy, oz] = [line.origin[first]!, line.origin[second]!, line.origin[third]!];
  const [dx, dy, dz] = [line.direction[first]!, line.direction[second]!, line.direction[third]!];
  const half = length / 2;
  let from = -farMm;
  let to = farMm;
  if (Math.abs(dz) < 1e-12) {
    if (Math.abs(oz) > half + slack) return null;
  } else {
    const [a, b] = [(-half - oz) / dz, (half - oz) / dz];
    from = Math.min(a, b);
    to = Math.max(a, b);
  }
  // inside: (distance from the axis)² − radius² ≤ 0, a quadratic A t² + 2 B t + C
  const grows = (frustum.end - frustum.start) / length;
  const r0 = (frustum.start + frustum.end) / 2 + grows * oz + slack;
  const dr = grows * dz;
  const A = dx * dx + dy * dy - dr * dr;
  const B = ox * dx + oy * dy - r0 * dr;
  const C = ox * ox + oy * oy - r0 * r0;
  const cuts = [from, ...roots(A, B, C).filter((t) => t > from && t < to), to];
  // between the ends the frustum is convex, so what is inside is one stretch
  const wet = cuts.flatMap((start, i) => {
    const end = cuts[i + 1];
    if (end === undefined) return [];
    const t = (start + end) / 2;
    return A * t * t + 2 * B * t + C <= 0 ? [start, end] : [];
  });
  return wet.length > 0 ? { from: wet[0]!, to: wet.at(-1)! } : null;
}

/** Real roots of A t² + 2 B t + C, ascending, without loss by subtraction. */
function roots(A: number, B: number, C: number): number[] {
  if (Math.abs(A) < 1e-14) return B === 0 ? [] : [-C / (2 * B)];
  const root = B * B - A * C;
  if (root < 0) return [];
  const q = -(B + (B < 0 ? -1 : 1) * Math.sqrt(root));
  const both = q === 0 ? [0] : [q / A, C / q];
  return both.sort((one, other) => one - other);
}
