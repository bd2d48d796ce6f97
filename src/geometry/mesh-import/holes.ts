import type { Mesh } from '../mesh';
import { unionFind } from '../union-find';
import type { Vec3 } from '../vec3';
import { endOf } from './edge-faults';

/** A rim of open edges that hang together. */
export interface Hole {
  edges: number;
  /** Middle of its edges. */
  at: Vec3;
}

/** The holes that open edges go round, the longest rims first. Two that meet in a corner count as one. */
export function holesOf({ positions, triangles }: Mesh, open: Uint32Array): Hole[] {
  const sets = unionFind(positions.length / 3);
  for (const n of open) sets.join(triangles[n]!, endOf(triangles, n));
  const holes = new Map<number, { edges: number; sum: [number, number, number] }>();
  for (const n of open) {
    const root = sets.find(triangles[n]!);
    let hole = holes.get(root);
    if (!hole) holes.set(root, (hole = { edges: 0, sum: [0, 0, 0] }));
    hole.edges += 1;
    for (const vertex of [triangles[n]!, endOf(triangles, n)]) {
      for (let axis = 0; axis < 3; axis += 1) {
        hole.sum[axis]! += positions[3 * vertex + axis]! / 2;
      }
    }
  }
  return [...holes.values()]
    .map(({ edges, sum }): Hole => ({
      edges,
      at: [sum[0] / edges, sum[1] / edges, sum[2] / edges],
    }))
    .sort((one, other) => other.edges - one.edges);
}
