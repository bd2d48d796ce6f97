import { horizontalAxes } from './horizontal-axes';
import { levels, type Mesh } from './mesh';
import { cross, dot, type Vec3 } from './vec3';

/** A mesh ordered by height along an up vector. */
export interface MeshHeights {
  /** Two horizontal axes and up. */
  axes: readonly [Vec3, Vec3, Vec3];
  /** Level of each vertex and its place along two horizontal axes, mm. */
  z: Float64Array;
  a: Float64Array;
  b: Float64Array;
  /** Vertices from the lowest up, and each vertex's place in that order. */
  order: Uint32Array;
  rank: Uint32Array;
  /** By triangle: its first vertex in that order, and its projected area (positive when it faces down), mm². */
  lowest: Uint32Array;
  projected: Float64Array;
  /** Least and greatest level, mm. */
  bottom: number;
  top: number;
  /** Triangles (index of their first corner) round a vertex. */
  trianglesOf(vertex: number): Uint32Array;
}

export function meshHeights(mesh: Mesh, up: Vec3): MeshHeights {
  const { triangles } = mesh;
  const [e1, e2] = horizontalAxes(up);
  const z = levels(mesh, up);
  const a = levels(mesh, e1);
  const b = levels(mesh, e2);
  const order = Uint32Array.from(z, (_, i) => i).sort(
    (one, other) => z[one]! - z[other]! || one - other,
  );
  const rank = new Uint32Array(order.length);
  order.forEach((vertex, place) => (rank[vertex] = place));

  const lowest = new Uint32Array(triangles.length / 3);
  const projected = new Float64Array(triangles.length / 3);
  const starts = new Uint32Array(z.length + 1);
  for (let n = 0; n < triangles.length; n += 3) {
    const i = triangles[n]!;
    const j = triangles[n + 1]!;
    const k = triangles[n + 2]!;
    let least = rank[i]! < rank[j]! ? i : j;
    if (rank[k]! < rank[least]!) least = k;
    lowest[n / 3] = least;
    projected[n / 3] =
      -0.5 * ((a[j]! - a[i]!) * (b[k]! - b[i]!) - (b[j]! - b[i]!) * (a[k]! - a[i]!));
    for (const vertex of [i, j, k]) starts[vertex + 1]! += 1;
  }
  for (let vertex = 0; vertex < z.length; vertex += 1) starts[vertex + 1]! += starts[vertex]!;
  const around = new Uint32Array(triangles.length);
  const filled = starts.slice();
  for (let n = 0; n < triangles.length; n += 1) {
    const vertex = triangles[n]!;
    around[filled[vertex]!] = n - (n % 3);
    filled[vertex]! += 1;
  }
  return {
    axes: [e1, e2, up],
    z,
    a,
    b,
    order,
    rank,
    lowest,
    projected,
    bottom: z[order[0]!]!,
    top: z[order.at(-1)!]!,
    trianglesOf: (vertex) => around.subarray(starts[vertex]!, starts[vertex + 1]!),
  };
}

/**
 * Whether the inside of the mesh lies straight below a vertex that none of its neighbours is lower than.
 * Such a vertex is the nearest of its surroundings to a point just below it, and the angle-weighted normal
 * at the nearest point tells inside from outside (Bærentzen and Aanæs 2005, from memory).
 */
export function solidBelow(
  mesh: Mesh,
  { axes, trianglesOf }: MeshHeights,
  vertex: number,
): boolean {
  const { triangles } = mesh;
  const up = axes[2];
  let sum = 0;
  for (const n of trianglesOf(vertex)) {
    const corner = [0, 1, 2].find((c) => triangles[n + c] === vertex)!;
    const here = vertexAt(mesh, vertex);
    const one = between(here, vertexAt(mesh, triangles[n + ((corner + 1) % 3)]!));
    const other = between(here, vertexAt(mesh, triangles[n + ((corner + 2) % 3)]!));
    const normal = cross(one, other);
    const area = Math.hypot(normal[0], normal[1], normal[2]);
    if (area === 0) continue;
    sum += (Math.atan2(area, dot(one, other)) * dot(normal, up)) / area;
  }
  return sum > 0;
}

/**
 * The first triangle that faces up into the space, straight below a place inside it; −1 when there is none.
 * The place is a vertex (whose own triangles do not count) or a point of the mesh's frame.
 */
export function floorBelow(mesh: Mesh, heights: MeshHeights, from: number | Vec3): number {
  const { triangles } = mesh;
  const { z, a, b, projected } = heights;
  const place = typeof from === 'number' ? vertexAt(mesh, from) : from;
  const [pa, pb, pz] = heights.axes.map((axis) => dot(axis, place)) as [number, number, number];
  let best = -1;
  let bestZ = -Infinity;
  for (let n = 0; n < triangles.length; n += 3) {
    const twice = -2 * projected[n / 3]!;
    if (twice >= 0) continue;
    const i = triangles[n]!;
    const j = triangles[n + 1]!;
    const k = triangles[n + 2]!;
    if (from === i || from === j || from === k) continue;
    const wi = ((a[j]! - pa) * (b[k]! - pb) - (b[j]! - pb) * (a[k]! - pa)) / twice;
    const wj = ((a[k]! - pa) * (b[i]! - pb) - (b[k]! - pb) * (a[i]! - pa)) / twice;
    const wk = 1 - wi - wj;
    if (wi < -1e-9 || wj < -1e-9 || wk < -1e-9) continue;
    const hit = wi * z[i]! + wj * z[j]! + wk * z[k]!;
    if (hit <= pz && hit > bestZ) {
      bestZ = hit;
      best = n;
    }
  }
  return best;
}

function vertexAt({ positions }: Mesh, vertex: number): Vec3 {
  return [positions[3 * vertex]!, positions[3 * vertex + 1]!, positions[3 * vertex + 2]!];
}

function between(from: Vec3, to: Vec3): Vec3 {
  return [to[0] - from[0], to[1] - from[1], to[2] - from[2]];
}
