import type { Mesh } from '../mesh';
import { unionFind } from '../union-find';
import { endOf } from './edge-faults';
import { withVertices } from './with-vertices';

/**
 * The mesh with the corners on the rims of its holes made one where they lie within about `near` of each other:
 * seams that a program wrote with too few digits. Nothing else moves. O(rim).
 *
 * @param open the edges of the rims, as edgeFaults gives them
 */
export function weldRims(mesh: Mesh, open: Uint32Array, near: number): Mesh {
  const { positions, triangles } = mesh;
  const rim = new Set<number>();
  for (const n of open) rim.add(triangles[n]!).add(endOf(triangles, n));

  const sets = unionFind(positions.length / 3);
  // a cell of the side `near` is stood for by its first corner: all the others in it are near
  const standsFor = new Map<string, number>();
  for (const vertex of rim) {
    const cell = [0, 1, 2].map((axis) => Math.floor(positions[3 * vertex + axis]! / near));
    for (let i = 0; i < 27; i += 1) {
      const beside = [(i % 3) - 1, (Math.floor(i / 3) % 3) - 1, Math.floor(i / 9) - 1];
      const other = standsFor.get(cell.map((value, axis) => value + beside[axis]!).join(' '));
      if (other !== undefined && distance(positions, vertex, other) <= near)
        sets.join(other, vertex);
    }
    const own = cell.join(' ');
    if (!standsFor.has(own)) standsFor.set(own, vertex);
  }
  return withVertices(mesh, (vertex) => sets.find(vertex)).mesh;
}

function distance(positions: Float64Array, one: number, other: number): number {
  return Math.hypot(
    ...[0, 1, 2].map((axis) => positions[3 * one + axis]! - positions[3 * other + axis]!),
  );
}
