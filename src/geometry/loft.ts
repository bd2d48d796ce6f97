import { polygonArea } from './outline-area';
import type { Vec2 } from './shape';
import { cross, dot, unit, type Vec3 } from './vec3';

/**
 * A solid between flat sections along x, mm: each a polygon (y, z) against the clock seen from high x, all of as many
 * corners. Between two sections every corner runs straight to the same corner of the next, so a section in between is
 * the polygon of the interpolated corners, and a side of it sweeps a bilinear patch.
 */
export interface Loft {
  /** Rising. */
  x: readonly number[];
  sections: readonly (readonly Vec2[])[];
}

/** Volume, mm³, exact: the area between two sections is quadratic in x, and Simpson's rule integrates that exactly. */
export function loftVolume({ x, sections }: Loft): number {
  let volume = 0;
  for (let i = 0; i + 1 < x.length; i += 1) {
    const [low, high] = [sections[i]!, sections[i + 1]!];
    const areas = polygonArea(low) + 4 * polygonArea(between(low, high, 0.5)) + polygonArea(high);
    volume += ((x[i + 1]! - x[i]!) * areas) / 6;
  }
  return volume;
}

/** The polygon at a share of the way from one section to the next. */
export function between(low: readonly Vec2[], high: readonly Vec2[], share: number): Vec2[] {
  return low.map(([y, z], j) => [y + share * (high[j]![0] - y), z + share * (high[j]![1] - z)]);
}

/** The patch that side j (from corner j to the next) sweeps after section i: its corners, outward against the clock. */
export function patchOf(
  { x, sections }: Loft,
  i: number,
  j: number,
): readonly [Vec3, Vec3, Vec3, Vec3] {
  const next = (j + 1) % sections[i]!.length;
  const at = (section: number, corner: number): Vec3 => {
    const [y, z] = sections[section]![corner]!;
    return [x[section]!, y, z];
  };
  return [at(i, j), at(i, next), at(i + 1, next), at(i + 1, j)];
}

/** Outward unit normal of a patch at its middle. */
export function patchNormal([a, b, c, d]: readonly [Vec3, Vec3, Vec3, Vec3]): Vec3 {
  return unit(cross(minus(c, a), minus(d, b)));
}

/** How far the corners of a patch stand off a plane: the part square to it of a − b + c − d, mm; 0 when it is flat. */
export function patchTwist(patch: readonly [Vec3, Vec3, Vec3, Vec3]): number {
  const [a, b, c, d] = patch;
  const twist: Vec3 = [0, a[1] - b[1] + c[1] - d[1], a[2] - b[2] + c[2] - d[2]];
  return Math.abs(dot(twist, patchNormal(patch)));
}

function minus(a: Vec3, b: Vec3): Vec3 {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
}
