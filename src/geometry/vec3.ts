/** A point or direction, right-handed axes, z up when the tank stands level. mm where it is a place. */
export type Vec3 = readonly [number, number, number];

/** Scalar product. */
export function dot(a: Vec3, b: Vec3): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

/** Vector product, right-handed. */
export function cross(a: Vec3, b: Vec3): Vec3 {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}

/** The same direction with length 1. The caller sees to it that `a` is not zero. */
export function unit(a: Vec3): Vec3 {
  const length = Math.hypot(a[0], a[1], a[2]);
  return [a[0] / length, a[1] / length, a[2] / length];
}

/** a + t·b */
export function along(a: Vec3, b: Vec3, t: number): Vec3 {
  return [a[0] + t * b[0], a[1] + t * b[1], a[2] + t * b[2]];
}

/** The opposite direction. */
export function opposite(a: Vec3): Vec3 {
  return [-a[0], -a[1], -a[2]];
}
