import type { Mesh } from '../mesh';

/**
 * The mesh with vertices put together: those that `into` sends to one vertex become that one. Triangles that lose
 * their area by it, because two corners are one, are dropped; so are vertices that no triangle uses.
 */
export function withVertices(
  { positions, triangles }: Mesh,
  into: (vertex: number) => number,
): { mesh: Mesh; dropped: number } {
  const kept = new Uint32Array(triangles.length);
  const number = new Int32Array(positions.length / 3).fill(-1);
  const places = new Float64Array(positions.length);
  let vertices = 0;
  let corners = 0;
  for (let n = 0; n < triangles.length; n += 3) {
    const i = into(triangles[n]!);
    const j = into(triangles[n + 1]!);
    const k = into(triangles[n + 2]!);
    if (i === j || j === k || k === i) continue;
    kept[corners] = numberOf(i);
    kept[corners + 1] = numberOf(j);
    kept[corners + 2] = numberOf(k);
    corners += 3;
  }
  return {
    mesh: { positions: places.slice(0, 3 * vertices), triangles: kept.slice(0, corners) },
    dropped: (triangles.length - corners) / 3,
  };

  function numberOf(vertex: number): number {
    if (number[vertex]! < 0) {
      number[vertex] = vertices;
      for (let axis = 0; axis < 3; axis += 1) {
        places[3 * vertices + axis] = positions[3 * vertex + axis]!;
      }
      vertices += 1;
    }
    return number[vertex]!;
  }
}
