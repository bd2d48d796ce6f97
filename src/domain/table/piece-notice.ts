import { shells } from '../../geometry/shells';
import { dustOfCapacity } from '../../geometry/tolerance';
import { along, type Vec3 } from '../../geometry/vec3';
import { chordsOf, type PlacedSolid } from '../tank/placed-solid';
import { formatNumber } from '../units/format-number';
import { facetStandOffMm } from './facet-stand-off';
import type { LiquidSpace } from './liquid-space';

/** Most vertices of a chamber that are looked at to tell which solids it lies in. */
const mostLooked = 200;

/**
 * A sentence that names the separate chambers of a liquid space by the solids they lie in; null when it is in
 * one piece. One stick cannot tell chambers apart, so such a tank is not issued.
 */
export function pieceNotice(solids: readonly PlacedSolid[], space: LiquidSpace): string | null {
  const chambers = shells(space.mesh).filter(
    ({ volumeMm3 }) => volumeMm3 > dustOfCapacity * space.volumeMm3,
  );
  if (chambers.length < 2) return null;
  const named = chambers.map(({ triangles, volumeMm3 }) => {
    const within = solids.filter(
      (one) => one.solid.role === 'holds' && touches(one, space, triangles),
    );
    const names = within.map(({ solid }) => `“${solid.id}”`).join(', ');
    return `${names} (${formatNumber(volumeMm3 / 1e6, 1)} L)`;
  });
  const list = `${named.slice(0, -1).join('; ')} and ${named.at(-1)}`;
  return `The liquid space is in ${chambers.length} pieces, which one stick cannot tell apart: ${list}. Join them, or make each a tank of its own.`;
}

function touches(
  one: PlacedSolid,
  { mesh, origin, facets }: LiquidSpace,
  triangles: Uint32Array,
): boolean {
  const slack = facetStandOffMm(one, facets) + 0.001;
  const every = Math.max(1, Math.floor(triangles.length / mostLooked));
  for (let n = 0; n < triangles.length; n += every) {
    const i = 3 * triangles[n]!;
    const own = [mesh.positions[i]!, mesh.positions[i + 1]!, mesh.positions[i + 2]!] as const;
    const point: Vec3 = along(own, origin, 1);
    const chords = chordsOf(one, { origin: point, direction: [0, 0, 1] }, slack);
    if (chords.some(({ from, to }) => from <= slack && to >= -slack)) return true;
  }
  return false;
}
