import type { PlacedSolid } from '../tank/placed-solid';

/**
 * How far, at most, a solid's facets stand off its true surface on either side, mm: D·π²/6N² round an axis (the
 * corners of an area-preserving polygon), twice that on a ball
 * or a dished end; 0 for flat faces.
 */
export function facetStandOffMm({ solid, kind }: PlacedSolid, facets: number): number {
  const curved = kind.curved(solid);
  if (!curved) return 0;
  const widest = Math.max(...kind.extent(solid), kind.widestMm?.(solid) ?? 0);
  return ((curved === 'twice' ? 4 : 2) * widest) / facets ** 2;
}
