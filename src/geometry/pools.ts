import { joinTree, type JoinTree, type Part } from './join-tree';
import { floorBelow, meshHeights, type MeshHeights } from './mesh-heights';
import type { Mesh } from './mesh';
import { nearestTriangle } from './nearest-on-mesh';
import { dot, type Vec3 } from './vec3';

/** A body of liquid that stands by itself, filled up to a level u·p. mm, mm³, in the mesh's frame. */
export interface Pool {
  levelMm: number;
  volumeMm3: number;
  /** A lowest place of it. */
  deepest: Vec3;
}

/**
 * What stays behind when a full space is drained, slowly and without siphon, through an opening at `point`
 * (which lies in the space or on its wall): liquid below the opening, pools behind sills, chambers that
 * never meet the opening. With `up` turned over, the air that a vent at `point` cannot let out. Volumes are
 * exact. A part that first meets the opening's part at height s is a pool filled to s.
 *
 * @param nearMm a point this close to the mesh lies on its wall
 */
export function restingPools(mesh: Mesh, up: Vec3, point: Vec3, nearMm: number): Pool[] {
  const heights = meshHeights(mesh, up);
  const opening = openingOf(mesh, heights, point, nearMm);
  const pools: Pool[] = [];
  let open = false;

  const tree: JoinTree = joinTree(mesh, heights, (level, meeting) => {
    if (!open && level > opening.level) openNow();
    if (!open) return;
    const drained = tree.partOf(opening.vertex);
    if (!meeting.includes(drained)) return;
    for (const part of meeting) if (part !== drained) pools.push(poolOf(tree, part, level));
  });
  tree.follow();
  if (!open) openNow();
  for (const chamber of tree.parts()) {
    if (chamber !== tree.partOf(opening.vertex)) pools.push(poolOf(tree, chamber, heights.top));
  }
  return pools.filter(({ volumeMm3 }) => volumeMm3 > 0);

  function openNow(): void {
    open = true;
    pools.push(poolOf(tree, tree.partOf(opening.vertex), opening.level));
  }
}

/** Pools that stand apart until the surface reaches the height at which they join. */
export interface PoolsJoining {
  levelMm: number;
  /** Each filled up to that level, two or more. */
  pools: readonly Pool[];
}

/** Where, as the space fills, bodies of liquid that stood apart become one; from the lowest join up. */
export function joiningPools(mesh: Mesh, up: Vec3): PoolsJoining[] {
  const heights = meshHeights(mesh, up);
  const joins: PoolsJoining[] = [];
  const tree: JoinTree = joinTree(mesh, heights, (levelMm, meeting) => {
    joins.push({ levelMm, pools: meeting.map((part) => poolOf(tree, part, levelMm)) });
  });
  tree.follow();
  return joins;
}

function poolOf(tree: JoinTree, part: Part, levelMm: number): Pool {
  return { levelMm, volumeMm3: tree.volumeBelow(part, levelMm), deepest: tree.deepestOf(part) };
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
