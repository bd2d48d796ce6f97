import { restingVolume } from '../../geometry/pools';
import { thinMm } from '../../geometry/tolerance';
import { opposite, type Vec3 } from '../../geometry/vec3';
import { invalid } from '../errors';
import type { TankDocument } from '../tank/document';
import { chordsOf, type PlacedSolid } from '../tank/placed-solid';
import { facetStandOffMm } from './facet-stand-off';
import type { LiquidSpace } from './liquid-space';

/**
 * Litres that the outlet cannot drain and litres of air that the vent cannot let out, as the tank stands;
 * 0 where there is no outlet or vent. Throws `invalid` when one of them lies outside the liquid space (more
 * than 0.01 mm off its wall).
 */
export function openings(
  document: TankDocument,
  solids: readonly PlacedSolid[],
  space: LiquidSpace,
  up: Vec3,
): { undrainableL: number; trappedL: number } {
  const { outlet, vent } = document;
  return {
    undrainableL: outlet ? resting('outlet', outlet, up) : 0,
    trappedL: vent ? resting('vent', vent, opposite(up)) : 0,
  };

  function resting(name: 'outlet' | 'vent', point: Vec3, direction: Vec3): number {
    if (!inside(solids, point)) {
      throw invalid(
        `/${name}`,
        `The ${name} does not lie in the liquid space: move it inside or onto the wall.`,
      );
    }
    const [x, y, z] = space.origin;
    const nearMm =
      2 * (thinMm + Math.max(...solids.map((one) => facetStandOffMm(one, space.facets))));
    return (
      restingVolume(space.mesh, direction, [point[0] - x, point[1] - y, point[2] - z], nearMm) / 1e6
    );
  }
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
