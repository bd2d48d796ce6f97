import type { TankDocument } from '../tank/document';
import type { PlacedSolid } from '../tank/placed-solid';

/**
 * What is worth knowing of outside sizes: solids that are all wall, and that near round joints the wall was taken off
 * coarsely. `solids` as placedSolids gives them.
 */
export function wallNotices(document: TankDocument, solids: readonly PlacedSolid[]): string[] {
  if (document.wall?.sizes !== 'outside') return [];
  const left = new Set(solids.map(({ solid }) => solid.id));
  const eaten = document.solids
    .filter(({ role, id }) => role === 'holds' && !left.has(id))
    .map(({ id }) => `Solid "${id}" is all wall: by itself it has no space inside.`);
  const roundJoints = solids.some(
    ({ kind, solid }) => kind.label === 'joints' && kind.curved(solid),
  );
  return roundJoints
    ? [...eaten, 'Wall taken off with a coarse ball where solids join: issued litres are finer.']
    : eaten;
}
