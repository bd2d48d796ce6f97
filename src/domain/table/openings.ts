import { restingPools, type Pool } from '../../geometry/pools';
import { thinMm } from '../../geometry/tolerance';
import { along, opposite, type Vec3 } from '../../geometry/vec3';
import { invalid } from '../errors';
import type { TankDocument } from '../tank/document';
import { chordsOf, type PlacedSolid } from '../tank/placed-solid';
import { facetStandOffMm } from './facet-stand-off';
import type { LiquidSpace } from './liquid-space';
import type { Standing } from './preview';

/** What cannot leave the tank as it stands. */
export interface Openings {
  /** Litres that the outlet cannot drain; 0 without an outlet. */
  undrainableL: number;
  /** Litres of air that the vent cannot let out; 0 without a vent. */
  trappedL: number;
  /** Each pool and pocket with its place, for the picture. */
  standing: readonly Standing[];
}

/**
 * What stays below the outlet and above the vent, pool by pool and pocket by pocket. Throws `invalid` when one
 * of them lies outside the liquid space (more than 0.01 mm off its wall).
 */
export function openings(
  document: TankDocument,
  solids: readonly PlacedSolid[],
  space: LiquidSpace,
  up: Vec3,
): Openings {
  const { outlet, vent } = document;
  const pools = outlet ? resting('outlet', outlet, up) : [];
  const pockets = vent ? resting('vent', vent, opposite(up)) : [];
  return {
    undrainableL: litresOf(pools),
    trappedL: litresOf(pockets),
    standing: [
      ...pools.map((pool) => standing('undrainable', pool, pool.levelMm)),
      // heights of a pocket were followed upside down
      ...pockets.map((pocket) => standing('trapped', pocket, -pocket.levelMm)),
    ],
  };

  function resting(name: 'outlet' | 'vent', point: Vec3, direction: Vec3): Pool[] {
    if (!inside(solids, point)) {
      throw invalid(
        `/${name}`,
        `The ${name} does not lie in the liquid space: move it inside or onto the wall.`,
      );
    }
    const nearMm =
      2 * (thinMm + Math.max(...solids.map((one) => facetStandOffMm(one, space.facets))));
    const pools = restingPools(space.mesh, direction, along(point, space.origin, -1), nearMm);
    const shift = direction.reduce((sum, part, axis) => sum + part * space.origin[axis]!, 0);
    return pools.map(({ levelMm, volumeMm3, deepest }) => ({
      levelMm: levelMm + shift,
      volumeMm3,
      deepest: along(deepest, space.origin, 1),
    }));
  }
}

function standing(what: Standing['what'], { volumeMm3, deepest }: Pool, levelMm: number): Standing {
  return { what, litres: volumeMm3 / 1e6, levelMm, at: deepest };
}

function litresOf(pools: readonly Pool[]): number {
  return pools.reduce((sum, { volumeMm3 }) => sum + volumeMm3, 0) / 1e6;
}

function inside(solids: readonly PlacedSolid[], point: Vec3): boolean {
  const line = { origin: point, direction: [0, 0, 1] as const };
  const meets = (one: PlacedSolid, slack: number) =>
    chordsOf(one, line, slack).some(({ from, to }) => from <= slack && to >= -slack);
  return (
    solids.some((one) => one.solid.role === 'holds' && meets(one, thinMm)) &&
    !solids.some((one) => one.solid.role === 'displaces' && meets(one, -thinMm))
  );
}
