import type { Mesh } from './mesh';
import type { Shape } from './shape';
import { cross, type Vec3 } from './vec3';

/**
 * A round shape with its radius grown by `mm` (shrunk when negative), flat ends and length unchanged. A flat
 * outline is moved out from its middle, which is right for a circle and near enough for an ellipse. The corners of
 * a mesh move along the mean direction of their faces.
 */
export function swollen(shape: Shape, mm: number): Shape {
  if (shape.form === 'revolution') {
    return {
      ...shape,
      profile: shape.profile.map(([radius, place]) => [grown(radius, mm), place]),
    };
  }
  if (shape.form === 'mesh') return { ...shape, mesh: movedOut(shape.mesh, mm) };
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

function movedOut({ positions, triangles }: Mesh, mm: number): Mesh {
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
  const moved = positions.map((value, index) => {
    const start = index - (index % 3);
    const size = Math.hypot(normals[start]!, normals[start + 1]!, normals[start + 2]!);
    return size === 0 ? value : value + (mm * normals[index]!) / size;
  });
  return { positions: moved, triangles };
}
