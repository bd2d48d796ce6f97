import { floorBelow, solidBelow, type MeshHeights } from './mesh-heights';
import type { Mesh } from './mesh';
import { unionFind } from './union-find';
import type { Vec3 } from './vec3';
import { wetBelow } from './wet-below';

/** A connected part of {p : u·p ≤ h}, named by one of its vertices; the name changes when parts join. */
export type Part = number;

/** The connected parts of the space below a rising level h, joined where they meet. */
export interface JoinTree {
  /** Lets h rise over all vertices; once. */
  follow(): void;
  /** The part that a vertex passed so far belongs to. */
  partOf(vertex: number): Part;
  /** All parts there are. */
  parts(): Part[];
  /** Volume of a part under a level s, mm³: Σ S·g(s) over the triangles whose lowest vertex is in it, exact, no cap. */
  volumeBelow(part: Part, s: number): number;
  /** The lowest vertex of a part, in the mesh's frame. */
  deepestOf(part: Part): Vec3;
}

/**
 * Sublevel sets of the solid, followed over its vertices in height order as sets joined along edges. A lowest
 * vertex with solid below it (the underside of something that displaces) starts nothing new: it belongs to the
 * floor below it.
 *
 * @param onMeeting told of every height at which two or more parts become one, before they do; parts no deeper
 *   than rounding are left out
 */
export function joinTree(
  mesh: Mesh,
  heights: MeshHeights,
  onMeeting: (level: number, meeting: readonly Part[]) => void,
): JoinTree {
  const { z, order, rank, lowest, projected, trianglesOf, top, bottom } = heights;
  const { positions, triangles } = mesh;
  const sets = unionFind(z.length);
  const birth = new Float64Array(z.length);
  const deepest = new Uint32Array(z.length);
  const rounding = 1e-9 * (top - bottom);

  return {
    follow() {
      for (const vertex of order) pass(vertex);
    },
    partOf: (vertex) => sets.find(vertex),
    parts: () => [...new Set(Array.from(lowest, (vertex) => sets.find(vertex)))],
    volumeBelow,
    deepestOf(part) {
      const i = 3 * deepest[sets.find(part)]!;
      return [positions[i]!, positions[i + 1]!, positions[i + 2]!];
    },
  };

  function pass(vertex: number): void {
    const level = z[vertex]!;
    const below = new Set<Part>();
    for (const n of trianglesOf(vertex)) {
      for (let c = 0; c < 3; c += 1) {
        const other = triangles[n + c]!;
        if (rank[other]! < rank[vertex]!) below.add(sets.find(other));
      }
    }
    birth[vertex] = level;
    deepest[vertex] = vertex;
    if (below.size === 0) {
      if (!solidBelow(mesh, heights, vertex)) return;
      const floor = floorBelow(mesh, heights, vertex);
      if (floor < 0) return;
      below.add(sets.find(lowest[floor / 3]!));
    }
    const meeting = [...below].filter((part) => level - birth[part]! > rounding);
    if (meeting.length > 1) onMeeting(level, meeting);
    let elder = vertex;
    for (const part of below) if (birth[part]! < birth[elder]!) elder = part;
    const [first, from] = [birth[elder]!, deepest[elder]!];
    let root: Part = vertex;
    for (const part of below) root = sets.join(part, root);
    birth[root] = first;
    deepest[root] = from;
  }

  function volumeBelow(part: Part, s: number): number {
    let volume = 0;
    for (let n = 0; n < triangles.length; n += 3) {
      const start = lowest[n / 3]!;
      if (z[start]! >= s || sets.find(start) !== part) continue;
      volume +=
        projected[n / 3]! *
        wetBelow(s, z[triangles[n]!]!, z[triangles[n + 1]!]!, z[triangles[n + 2]!]!);
    }
    return volume;
  }
}
