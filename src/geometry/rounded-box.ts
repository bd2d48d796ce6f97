import { axisOrder, type Axis } from './shape';
import type { Vec3 } from './vec3';

/**
 * A box with rounded edges, centred on the origin, mm: a rectangle with rounded corners along an axis, both of
 * whose rims a ball of the radius `rim` has rolled round. It is every point within `rim` of the same body made
 * smaller by it and with sharp rims, so it is convex.
 */
export interface RoundedBox {
  axis: Axis;
  /** Along the axis's outline directions, then along the axis itself. */
  size: Vec3;
  /** Radius of the four edges along the axis; at most half of the first and of the second size. */
  corner: number;
  /** Radius of the eight round the two ends; at most `corner` and half of the third size. */
  rim: number;
}

/**
 * Volume, mm³, by Steiner's formula for the points within r of a convex body: V + S r + M r² + 4π r³/3, where a
 * prism of base area A, girth L and length h has V = A h, S = 2A + L h and M = π h + π L/2 (the rims' edges turn by a
 * right angle, the girth by a whole turn). The base has the corner radius ρ = corner − rim, so
 * A = a b − (4 − π) ρ² and L = 2 (a + b) − (8 − 2π) ρ.
 */
export function roundedBoxVolume({ size, corner, rim }: RoundedBox): number {
  const [a, b, h] = size.map((length) => length - 2 * rim) as [number, number, number];
  const inner = corner - rim;
  const area = a * b - (4 - Math.PI) * inner ** 2;
  const girth = 2 * (a + b) - (8 - 2 * Math.PI) * inner;
  return (
    area * h +
    (2 * area + girth * h) * rim +
    Math.PI * (h + girth / 2) * rim ** 2 +
    ((4 * Math.PI) / 3) * rim ** 3
  );
}

/** Greatest u·p over the box, mm, exact; `up` a unit vector of its frame. */
export function roundedBoxSupport({ axis, size, corner, rim }: RoundedBox, up: Vec3): number {
  const [a, b, c] = axisOrder(axis).map((i) => Math.abs(up[i]!)) as [number, number, number];
  return (
    a * (size[0] / 2 - corner) +
    b * (size[1] / 2 - corner) +
    (corner - rim) * Math.hypot(a, b) +
    c * (size[2] / 2 - rim) +
    rim
  );
}

/** How far a point lies outside the box's surface (below 0: inside), mm; a convex function, exact outside. */
export function roundedBoxDistance({ axis, size, corner, rim }: RoundedBox, point: Vec3): number {
  const [x, y, z] = axisOrder(axis).map((i) => Math.abs(point[i]!)) as [number, number, number];
  const across = outside(x - size[0] / 2 + corner, y - size[1] / 2 + corner) - (corner - rim);
  return outside(across, z - size[2] / 2 + rim) - rim;
}

/** Distance from a right-angled corner, of a point so far beyond either of its sides. */
function outside(one: number, other: number): number {
  return Math.min(Math.max(one, other), 0) + Math.hypot(Math.max(one, 0), Math.max(other, 0));
}
