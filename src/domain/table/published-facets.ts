import type { PlacedSolid } from '../tank/placed-solid';

/**
 * 2N, the facets to a turn that a table is published at: finer where few solids are round, so that time stays
 * within a second or so. A ball has as many triangles at 256 as sixty cylinders.
 */
export function publishedFacets(solids: readonly PlacedSolid[]): 512 | 256 | 128 {
  const once = solids.filter(({ kind, solid }) => kind.curved(solid) === 'once').length;
  const twice = solids.filter(({ kind, solid }) => kind.curved(solid) === 'twice').length;
  if (twice === 0 && once <= 4) return 512;
  return twice <= 2 && once <= 40 ? 256 : 128;
}

/** No table is published at more facets to a turn. */
export const finestFacets = 512;
