import { floorBelow, meshHeights, solidBelow, type MeshHeights } from './mesh-heights';
import type { Mesh } from './mesh';
import { nearestTriangle } from './nearest-on-mesh';
import { unionFind } from './union-find';
import { dot, type Vec3 } from './vec3';
import { wetBelow } from './wet-below';

/**
 * What stays behind when a full space is drained, slowly and without siphon, through an opening at `point`
 * (which lies in the space or on its wall): liquid below the opening, pools behind sills, chambers that
 * never meet the opening. mm³; with `up` turned over, the air that a vent at `point` cannot let out.
 *
 * The connected parts of {p : u·p ≤ h} are followed as h rises over the vertices, as sets joined along edges
 * (a join tree). A part that first meets the opening's part at height s is a pool filled to s; its volume
 * is Σ S·g(s) over its own triangles, exact, without a cap. A lowest vertex with liquid below it (the
 * underside of something that displaces) starts nothing new: it belongs to the floor below it.
 *
 * @param nearMm a point this close to the mesh lies on its wall
 */
export function restingVolume(mesh: Mesh, up: Vec3, point: Vec3, nearMm: number): number {
  const heights = meshHeights(mesh, up);
  const { z, order, rank, lowest, projected, trianglesOf } = heights;
  const { triangles } = mesh;
  const sets = unionFind(z.length);
  const birth = new Float64Array(z.length);
  const rounding = 1e-9 * (z[order.at(-1)!]! - z[order[0]!]!);

  const opening = openingOf(mesh, heights, point, nearMm);
  let openRoot = -1;
  let resting = 0;

  for (const vertex of order) {
    if (openRoot < 0 && z[vertex]! > opening.level) open();
    const roots = new Set<number>();
    for (const n of trianglesOf(vertex)) {
      for (let c = 0; c < 3; c += 1) {
        const other = triangles[n + c]!;
        if (rank[other]! < rank[vertex]!) roots.add(sets.find(other));
      }
    }
    if (roots.size === 0) {
      birth[vertex] = z[vertex]!;
      if (solidBelow(mesh, heights, vertex)) {
        const floor = floorBelow(mesh, heights, vertex);
        if (floor >= 0) roots.add(sets.find(lowest[floor / 3]!));
      }
    }
    const meetsOpening = openRoot >= 0 && roots.has(sets.find(openRoot));
    let first = Infinity;
    for (const root of roots) {
      if (meetsOpening && root !== sets.find(openRoot) && z[vertex]! - birth[root]! > rounding) {
        resting += below(root, z[vertex]!);
      }
      first = Math.min(first, birth[root]!);
    }
    let root = vertex;
    for (const other of roots) root = sets.join(other, root);
    if (roots.size > 0) birth[root] = first;
  }
  if (openRoot < 0) open();

  const top = z[order.at(-1)!]!;
  const apart = new Set<number>();
  for (const vertex of lowest) apart.add(sets.find(vertex));
  apart.delete(sets.find(openRoot));
  for (const root of apart) resting += below(root, top);
  return Math.max(resting, 0);

  function open(): void {
    openRoot = opening.vertex;
    resting += below(sets.find(openRoot), opening.level);
  }

  /** Volume under the level s of the part with this root: triangles belong to the part of their lowest vertex. */
  function below(root: number, s: number): number {
    let volume = 0;
    for (let n = 0; n < triangles.length; n += 3) {
      const start = lowest[n / 3]!;
      if (z[start]! >= s || sets.find(start) !== root) continue;
      volume +=
        projected[n / 3]! *
        wetBelow(s, z[triangles[n]!]!, z[triangles[n + 1]!]!, z[triangles[n + 2]!]!);
    }
    return volume;
  }
}

/** The opening's level and a vertex of its part that is no higher. */
function openingOf(mesh: Mesh, heights: MeshHeights, point: Vec3, nearMm: number) {
  const { axes, z, lowest } = heights;
  const own = dot(axes[2], point);
  const nearest = nearestTriangle(mesh, point);
  const inside = nearest.distanceMm > nearMm ? floorBelow(mesh, heights, point) : -1;
  const vertex = lowest[(inside >= 0 ? inside : nearest.triangle) / 3]!;
  return { vertex, level: Math.max(own, z[vertex]!) };
}
