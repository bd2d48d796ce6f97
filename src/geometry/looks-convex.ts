import type { Shape } from './shape';
import { shapeFaces, type ShapeFaces } from './shape-faces';
import { cross, dot, type Vec3 } from './vec3';

/**
 * Whether a shape looks convex from every side, to 1e-6 of its size. Every turned body does: meridians of
 * all kinds are convex but for ends turned inward, and those the barrel hides.
 */
export function looksConvex(shape: Shape): boolean {
  return shape.form === 'revolution' || turnsOutward(shapeFaces(shape));
}

/** Whether no face has, beyond any of its edges, a corner of the neighbour before it; and all faces hang together. */
function turnsOutward({ points, faces }: ShapeFaces): boolean {
  const owner = new Map<number, number>();
  faces.forEach((face, f) => {
    face.forEach((a, i) => owner.set(a * points.length + face[(i + 1) % face.length]!, f));
  });
  const reached = new Set([0]);
  for (const f of reached) {
    const face = faces[f]!;
    face.forEach((a, i) => {
      const other = owner.get(face[(i + 1) % face.length]! * points.length + a);
      if (other !== undefined) reached.add(other);
    });
  }
  if (reached.size < faces.length) return false;
  const size = Math.max(...points.map((point) => Math.hypot(...point)));
  return faces.every((face) => {
    const from = points[face[0]!]!;
    const normal = normalOf(face, points);
    return face.every((a, i) => {
      const b = face[(i + 1) % face.length]!;
      const other = faces[owner.get(b * points.length + a) ?? -1];
      return other?.every((vertex) => {
        const point = points[vertex]!;
        const off: Vec3 = [point[0] - from[0], point[1] - from[1], point[2] - from[2]];
        return dot(normal, off) <= 1e-6 * size;
      });
    });
  });
}

/** Unit normal of a flat face, by Newell's sum over its edges. */
function normalOf(face: readonly number[], points: readonly Vec3[]): Vec3 {
  let [x, y, z] = [0, 0, 0];
  const from = points[face[0]!]!;
  const off = (i: number): Vec3 => {
    const point = points[face[i]!]!;
    return [point[0] - from[0], point[1] - from[1], point[2] - from[2]];
  };
  for (let i = 1; i + 1 < face.length; i += 1) {
    const part = cross(off(i), off(i + 1));
    [x, y, z] = [x + part[0], y + part[1], z + part[2]];
  }
  const length = Math.hypot(x, y, z) || 1;
  return [x / length, y / length, z / length];
}
