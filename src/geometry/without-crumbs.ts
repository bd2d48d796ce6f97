import type { Mesh } from './mesh';
import { shells } from './shells';

/** A closed mesh without the loose parts and enclosed voids of less than `leastMm3`. */
export function withoutCrumbs(mesh: Mesh, leastMm3: number): Mesh {
  const parts = shells(mesh);
  const kept = parts.filter(({ volumeMm3 }) => Math.abs(volumeMm3) >= leastMm3);
  if (kept.length === parts.length) return mesh;
  const index = new Map<number, number>();
  const positions: number[] = [];
  const triangles = kept.flatMap((part) =>
    Array.from(part.triangles, (vertex) => {
      const known = index.get(vertex);
      if (known !== undefined) return known;
      const fresh = index.size;
      index.set(vertex, fresh);
      for (let axis = 0; axis < 3; axis += 1) positions.push(mesh.positions[3 * vertex + axis]!);
      return fresh;
    }),
  );
  return { positions: Float64Array.from(positions), triangles: Uint32Array.from(triangles) };
}
