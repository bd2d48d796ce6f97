import { levels } from '../../geometry/mesh';
import { samePlaceMm } from '../../geometry/tolerance';
import { dot, opposite, type Vec3 } from '../../geometry/vec3';
import { highestLevel, type PlacedSolid } from '../tank/placed-solid';
import { facetStandOffMm } from './facet-stand-off';
import type { LiquidSpace } from './liquid-space';

/**
 * Lowest and highest level u·p of the liquid space along a unit vector of the tank's frame, mm. From
 * closed form, unless what displaces cuts the extreme off: then it is the mesh's own, exact for flat faces.
 */
export function extremes(
  solids: readonly PlacedSolid[],
  { mesh, origin, facets }: LiquidSpace,
  up: Vec3,
): readonly [number, number] {
  const holds = solids.filter(({ solid }) => solid.role === 'holds');
  let low = Infinity;
  let high = -Infinity;
  for (const level of levels(mesh, up)) {
    if (level < low) low = level;
    if (level > high) high = level;
  }
  const shift = dot(up, origin);
  const slack = Math.max(...holds.map((one) => facetStandOffMm(one, facets))) + samePlaceMm;
  return [-exactIfNear(opposite(up), -(low + shift)), exactIfNear(up, high + shift)];

  function exactIfNear(direction: Vec3, ofMesh: number): number {
    const exact = Math.max(...holds.map((one) => highestLevel(one, direction)));
    return Math.abs(exact - ofMesh) <= slack ? exact : ofMesh;
  }
}
