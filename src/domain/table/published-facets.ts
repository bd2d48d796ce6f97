import { placedShape, type PlacedSolid } from '../tank/placed-solid';

/** Facets to a turn that a table may be published at, finest first. */
const choices = [512, 256, 128] as const;

/**
 * What joining and cutting may cost at the facets chosen, in triangles that go in (about 5 µs each, so a third of
 * a second), and what it may cost when the facets are doubled for the sake of the bound.
 */
const usualTriangles = 60_000;
const mostTriangles = 140_000;

/** One solid alone is never joined or cut: its triangles cost a twentieth of that. */
const aloneTriangles = 100_000;

/**
 * 2N, the facets to a turn that a table is published at: the finest that takes a fraction of a second. A pair of
 * formed ends has as many triangles at 256 as sixty plain cylinders.
 */
export function publishedFacets(solids: readonly PlacedSolid[]): number {
  const most = solids.length === 1 ? aloneTriangles : usualTriangles;
  return choices.find((facets) => cost(solids, facets) <= most) ?? choices.at(-1)!;
}

/** Twice as many where that can be had in a second or so; null where it cannot, or where nothing finer is made. */
export function doubledFacets(solids: readonly PlacedSolid[], facets: number): number | null {
  const most = solids.length === 1 ? 3 * aloneTriangles : mostTriangles;
  return facets < choices[0] && cost(solids, 2 * facets) <= most ? 2 * facets : null;
}

/** Triangles of all solids; those of a prism count twice, since its long thin ones cross more of the others'. */
function cost(solids: readonly PlacedSolid[], facets: number): number {
  return solids.reduce((sum, one) => {
    // less its wall a solid has about as many as drawn, and what its joints add is not made to be counted
    const { shape } = placedShape(one.drawn ?? one, facets);
    if (shape.form === 'mesh') return sum + shape.mesh.triangles.length / 3;
    if (shape.form === 'extrusion') return sum + 8 * shape.outline.length;
    return sum + 2 * shape.profile.length * shape.facets;
  }, 0);
}
