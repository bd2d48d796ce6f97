import { levels, type Mesh } from './mesh';
import type { Vec3 } from './vec3';

/**
 * Where a level plane u·p = level cuts a closed mesh: its outline as closed loops of points (x, y, z, x, …),
 * mm, the last one not repeated. Seen from above, against the clock round liquid and with it round an
 * island. One pass over the triangles, fast enough for every frame of a drag. A plane that only touches
 * the mesh gives no loop from above.
 */
export function sectionLoops(mesh: Mesh, up: Vec3, level: number): Float64Array[] {
  const { positions, triangles } = mesh;
  const z = levels(mesh, up);
  const vertices = z.length;
  // the cut runs from the edge where a triangle is entered to the one where it is left
  const next = new Map<number, number>();
  for (let n = 0; n < triangles.length; n += 3) {
    const corners = [triangles[n]!, triangles[n + 1]!, triangles[n + 2]!] as const;
    const above = corners.map((corner) => z[corner]! >= level);
    if (above[0] === above[1] && above[1] === above[2]) continue;
    let enter = -1;
    let leave = -1;
    for (let side = 0; side < 3; side += 1) {
      const from = corners[side]!;
      const to = corners[(side + 1) % 3]!;
      if (above[side] === above[(side + 1) % 3]) continue;
      const edge = Math.min(from, to) * vertices + Math.max(from, to);
      if (above[side]) leave = edge;
      else enter = edge;
    }
    next.set(leave, enter);
  }

  const loops: Float64Array[] = [];
  while (next.size > 0) {
    const first = next.keys().next().value as number;
    const points: number[] = [];
    let edge: number | undefined = first;
    do {
      const low: number = Math.floor(edge / vertices);
      const high: number = edge % vertices;
      const t = (level - z[low]!) / (z[high]! - z[low]!);
      for (let axis = 0; axis < 3; axis += 1) {
        const start = positions[3 * low + axis]!;
        points.push(start + t * (positions[3 * high + axis]! - start));
      }
      const after: number | undefined = next.get(edge);
      next.delete(edge);
      edge = after;
    } while (edge !== undefined && edge !== first);
    loops.push(Float64Array.from(points));
  }
  return loops;
}

/** The same outline as separate straight bits, two points (x, y, z, x, y, z) each, for a renderer of line segments. */
export function sectionSegments(mesh: Mesh, up: Vec3, level: number): Float64Array {
  const loops = sectionLoops(mesh, up, level);
  const segments = new Float64Array(2 * loops.reduce((sum, loop) => sum + loop.length, 0));
  let filled = 0;
  for (const loop of loops) {
    for (let i = 0; i < loop.length; i += 3) {
      const j = (i + 3) % loop.length;
      segments.set(loop.subarray(i, i + 3), filled);
      segments.set(loop.subarray(j, j + 3), filled + 3);
      filled += 6;
    }
  }
  return segments;
}
