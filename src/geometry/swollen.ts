import type { Mesh } from './mesh';
import type { Shape, Vec2 } from './shape';
import { cross, dot, type Vec3 } from './vec3';

/** A vertex nearer to a flat face than this lies in it. mm */
const inFaceMm = 1e-6;

/**
 * A round shape with its radius grown by `mm` (shrunk when negative), flat faces and length unchanged. A flat
 * outline is moved out from its middle, which is right for a circle and near enough for an ellipse; where it says
 * which of its sides are flat, only the corners between chords move, square to the outline. The corners of a mesh
 * that lie in no flat face move along the mean direction of their faces.
 */
export function swollen(shape: Shape, mm: number): Shape {
  if (shape.form === 'revolution') {
    return {
      ...shape,
      profile: shape.profile.map(([radius, place]) => [grown(radius, mm), place]),
    };
  }
  if (shape.form === 'mesh') return { ...shape, mesh: movedOut(shape, mm) };
  const { flat } = shape;
  // an offset outline has other sides than the one it came from
  if (flat?.length === shape.outline.length)
    return { ...shape, outline: roundMovedOut(shape.outline, flat, mm) };
  const outline = shape.outline.map(([a, b]) => {
    const radius = Math.hypot(a, b);
    const factor = grown(radius, mm) / radius;
    return [a * factor, b * factor] as const;
  });
  return { ...shape, outline };
}

function grown(radius: number, mm: number): number {
  return radius === 0 ? 0 : Math.max(radius + mm, radius / 2);
}

function roundMovedOut(
  outline: readonly Vec2[],
  flat: readonly boolean[],
  mm: number,
): readonly Vec2[] {
  const n = outline.length;
  return outline.map((point, i) => {
    const before = (i + n - 1) % n;
    if (flat[before] || flat[i]) return point;
    const [ax, ay] = outline[before]!;
    const [bx, by] = outline[(i + 1) % n]!;
    const size = Math.hypot(bx - ax, by - ay);
    return [point[0] + (mm * (by - ay)) / size, point[1] - (mm * (bx - ax)) / size];
  });
}

/** A mesh with its corners moved out along the mean direction of their faces, in where `mm` is negative. */
export function movedOut({ mesh, flat = [] }: Extract<Shape, { form: 'mesh' }>, mm: number): Mesh {
  const { positions, triangles } = mesh;
  const at = (vertex: number): Vec3 => [
    positions[3 * vertex]!,
    positions[3 * vertex + 1]!,
    positions[3 * vertex + 2]!,
  ];
  const normals = new Float64Array(positions.length);
  for (let n = 0; n < triangles.length; n += 3) {
    const [i, j, k] = [triangles[n]!, triangles[n + 1]!, triangles[n + 2]!];
    const [a, b, c] = [at(i), at(j), at(k)];
    const normal = cross(
      [b[0] - a[0], b[1] - a[1], b[2] - a[2]],
      [c[0] - a[0], c[1] - a[1], c[2] - a[2]],
    );
    for (const vertex of [i, j, k]) {
      for (let axis = 0; axis < 3; axis += 1) normals[3 * vertex + axis]! += normal[axis]!;
    }
  }
  const stays = Array.from({ length: positions.length / 3 }, (_, vertex) =>
    flat.some(({ normal, offset }) => Math.abs(dot(normal, at(vertex)) - offset) < inFaceMm),
  );
  const moved = positions.map((value, index) => {
    const start = index - (index % 3);
    if (stays[start / 3]) return value;
    const size = Math.hypot(normals[start]!, normals[start + 1]!, normals[start + 2]!);
    return size === 0 ? value : value + (mm * normals[index]!) / size;
  });
  return { positions: moved, triangles };
}
