import type { Vec3 } from './vec3';

/**
 * Two unit vectors that make a right-handed frame (e1, e2, up): x and y carried along when z is turned
 * the short way onto `up` (a unit vector). Exactly x and y for up = z.
 */
export function horizontalAxes([x, y, z]: Vec3): readonly [Vec3, Vec3] {
  if (z < 0) {
    const [e1, e2] = horizontalAxes([-x, -y, -z]);
    return [e1, [-e2[0], -e2[1], -e2[2]]];
  }
  const k = 1 / (1 + z);
  return [
    [1 - x * x * k, -x * y * k, -x],
    [-x * y * k, 1 - y * y * k, -y],
  ];
}
