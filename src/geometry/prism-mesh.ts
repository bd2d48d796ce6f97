import type { Mesh } from './mesh';
import { toTank, type Placing } from './placing';
import { axisOrder, type Shape, type Vec2 } from './shape';
import type { Vec3 } from './vec3';

/**
 * The mesh of an extruded convex outline, straight from its numbers, in the tank's frame moved by −origin;
 * null when the outline is not convex, where cutting its ends into triangles is the mesh library's work.
 */
export function prismMesh(
  shape: Extract<Shape, { form: 'extrusion' }>,
  place: Placing,
  origin: Vec3,
): Mesh | null {
  const { outline, axis, length } = shape;
  if (!isConvex(outline)) return null;
  const n = outline.length;
  const order = axisOrder(axis);
  const positions = new Float64Array(6 * n);
  const own: [number, number, number] = [0, 0, 0];
  for (let end = 0; end < 2; end += 1) {
    outline.forEach(([a, b], i) => {
      own[order[0]] = a;
      own[order[1]] = b;
      own[order[2]] = end === 0 ? -length / 2 : length / 2;
      const point = toTank(place, own);
      for (let k = 0; k < 3; k += 1) positions[3 * (end * n + i) + k] = point[k]! - origin[k]!;
    });
  }
  const triangles: number[] = [];
  for (let i = 0; i < n; i += 1) {
    const j = (i + 1) % n;
    triangles.push(i, j, n + j, i, n + j, n + i);
    if (i > 0 && j > 0) triangles.push(0, j, i, n, n + i, n + j);
  }
  return { positions, triangles: Uint32Array.from(triangles) };
}

/** Whether an outline turns against the clock at every corner. */
function isConvex(outline: readonly Vec2[]): boolean {
  const n = outline.length;
  return outline.every(([x, y], i) => {
    const [x1, y1] = outline[(i + 1) % n]!;
    const [x2, y2] = outline[(i + 2) % n]!;
    return (x1 - x) * (y2 - y1) - (y1 - y) * (x2 - x1) > 0;
  });
}
