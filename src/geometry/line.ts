import type { Interval } from './intervals';
import { axisOrder, type Axis } from './shape';
import type { Vec3 } from './vec3';

/** Points origin + t·direction; `direction` a unit vector, so that t is in mm. */
export interface Line {
  origin: Vec3;
  direction: Vec3;
}

/** A half-space normal·p ≤ offset; the normal need not be a unit vector. */
export interface HalfSpace {
  normal: Vec3;
  offset: number;
}

/**
 * The stretch of a line inside all the half-spaces (a convex solid with flat faces), its surface
 * included within `slack` mm; null when the line misses it.
 */
export function lineInHalfSpaces(
  line: Line,
  faces: readonly HalfSpace[],
  slack: number,
): Interval | null {
  let from = -Infinity;
  let to = Infinity;
  for (const { normal, offset } of faces) {
    const size = Math.hypot(normal[0], normal[1], normal[2]);
    const rate =
      (normal[0] * line.direction[0] +
        normal[1] * line.direction[1] +
        normal[2] * line.direction[2]) /
      size;
    const inside =
      (offset -
        normal[0] * line.origin[0] -
        normal[1] * line.origin[1] -
        normal[2] * line.origin[2]) /
      size;
    if (Math.abs(rate) < 1e-12) {
      if (inside < -slack) return null;
    } else if (rate > 0) to = Math.min(to, inside / rate);
    else from = Math.max(from, inside / rate);
  }
  return to >= from ? { from, to } : null;
}

/**
 * The stretch of a line inside the ellipsoid or elliptic cylinder Σ (p_i / half_i)² ≤ 1; an infinite
 * half-axis makes a cylinder along it. Its surface is included within `slack` mm.
 */
export function lineInQuadric(line: Line, half: Vec3, slack: number): Interval | null {
  let a = 0;
  let b = 0;
  let c = -1;
  for (let axis = 0; axis < 3; axis += 1) {
    const o = line.origin[axis]! / half[axis]!;
    const d = line.direction[axis]! / half[axis]!;
    a += d * d;
    b += o * d;
    c += o * o;
  }
  const least = Math.min(half[0], half[1], half[2]);
  if (a < 1e-24 / (least * least))
    return c <= (2 * slack) / least ? { from: -Infinity, to: Infinity } : null;
  const middle = -b / a;
  const root = middle * middle - c / a;
  if (root < 0) return c - (b * b) / a <= (2 * slack) / least ? { from: middle, to: middle } : null;
  // the farther root first, the other from the product of both: no digits lost to subtraction
  const far = middle < 0 ? middle - Math.sqrt(root) : middle + Math.sqrt(root);
  const near = far === 0 ? -Math.sqrt(root) : c / a / far;
  return { from: Math.min(far, near), to: Math.max(far, near) };
}

/** The stretch of a line inside an elliptic cylinder of a length along an axis, both centred on the origin. */
export function lineInBarrel(
  line: Line,
  barrel: { axis: Axis; half: readonly [number, number]; length: number },
  slack: number,
): Interval | null {
  const [first, second, third] = axisOrder(barrel.axis);
  const half: [number, number, number] = [Infinity, Infinity, Infinity];
  half[first] = barrel.half[0];
  half[second] = barrel.half[1];
  const normal: [number, number, number] = [0, 0, 0];
  normal[third] = 1;
  const round = lineInQuadric(line, half, slack);
  const offset = barrel.length / 2;
  const back: Vec3 = [-normal[0], -normal[1], -normal[2]];
  const between = lineInHalfSpaces(
    line,
    [
      { normal, offset },
      { normal: back, offset },
    ],
    slack,
  );
  if (!round || !between) return null;
  const from = Math.max(round.from, between.from);
  const to = Math.min(round.to, between.to);
  return to >= from ? { from, to } : null;
}
