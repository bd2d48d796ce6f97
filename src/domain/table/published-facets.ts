import { cutCaps } from '../../geometry/cut-caps';
import type { PlacedShape } from '../../geometry/placed-shape';
import { isJoints } from '../tank/joints';
import { highestLevel, placedShape, type PlacedSolid } from '../tank/placed-solid';

/** Facets to a turn that a table may be published at, finest first; half of each is a multiple of 16 too. */
const choices = [512, 384, 256, 192, 128] as const;

/**
 * What joining and cutting may cost at the facets chosen, in triangles that go in (about 5 µs each, so a third of
 * a second), and what it may cost when the facets are doubled for the sake of the bound.
 */
const usualTriangles = 75_000;
const mostTriangles = 260_000;

/** Beyond this even the coarsest of them would take many seconds (dozens of balls): then coarser still, and the bound says so. */
const heavyTriangles = 400_000;
const coarser = [64, 32] as const;

/** A triangle that nothing is joined to or cut from is only swept: it costs a third of the others. */
const sweptShare = 0.3;

/** Where the wall is taken off as a mesh each triangle is offset, joined and cut: so much dearer. */
const offsetShare = 4;
const heavyOffset = 8000;

/**
 * 2N, the facets to a turn that a table is published at: the finest that takes a fraction of a second. A pair of
 * formed ends has as many triangles at 256 as sixty plain cylinders, but counts little where nothing comes near.
 */
export function publishedFacets(solids: readonly PlacedSolid[]): number {
  const finest = solids.some(isOffsetMesh) ? finestOffset(solids) : choices[0];
  if (finest < choices.at(-1)!) return finest;
  const usual = choices.find(
    (facets) => facets <= finest && cost(solids, facets) <= usualTriangles,
  );
  if (usual !== undefined) return usual;
  const last = choices.at(-1)!;
  if (cost(solids, last) <= heavyTriangles) return last;
  return coarser.find((facets) => cost(solids, facets) <= heavyTriangles) ?? coarser.at(-1)!;
}

/** Twice as many where that can be had in a second or so; null where it cannot, or where nothing finer is made. */
export function doubledFacets(solids: readonly PlacedSolid[], facets: number): number | null {
  if (solids.some(isOffsetMesh)) return null;
  return facets < choices[0] && cost(solids, 2 * facets) <= mostTriangles ? 2 * facets : null;
}

/** A joint of solids with outside sizes, or a solid without a closed form inside its wall (a hull by its stations). */
function isOffsetMesh(one: PlacedSolid): boolean {
  if (isJoints(one)) return true;
  if (!one.drawn || one.kind === one.drawn.kind) return false;
  return placedShape(one.drawn, choices.at(-1)!).shape.form === 'mesh';
}

/**
 * The offset of bent surfaces grows dearer than its triangles tell: ten seconds at 256 for a hull and an egg, as long
 * at 128 where a formed end or a ball is joined to others under a thick wall.
 */
function finestOffset(solids: readonly PlacedSolid[]): number {
  if (!solids.some(({ kind, solid }) => kind.curved(solid) === 'twice')) return 256;
  const coarsest = choices.at(-1)!;
  const heavy = solids.some(
    (one) =>
      one.drawn &&
      !isJoints(one) &&
      hasThickWall(one) &&
      trianglesOf([placedShape(one.drawn, coarsest)]) > heavyOffset,
  );
  return heavy ? coarser[0] : coarsest;
}

/** More than a twenty-fifth of the least size: no tank of sheet or moulding has one. */
function hasThickWall(one: PlacedSolid): boolean {
  const drawn = one.drawn!;
  const wallMm = highestLevel(drawn, [0, 0, 1]) - highestLevel(one, [0, 0, 1]);
  return 25 * wallMm > Math.min(...drawn.kind.extent(drawn.solid));
}

function cost(solids: readonly PlacedSolid[], facets: number): number {
  // less its wall a solid has about as many as drawn, and what its joints add is not made to be counted
  const shapes = (role: 'holds' | 'displaces') =>
    solids
      .filter(({ solid }) => solid.role === role)
      .map((one) => placedShape(one.drawn ?? one, facets));
  const holds = shapes('holds');
  const displaces = shapes('displaces');
  const swept = sweptShare * (trianglesOf(holds) + trianglesOf(displaces));
  if (holds.length === 1 && displaces.length === 0) return swept;
  const joined = cutCaps(holds, displaces) ?? { holds, displaces };
  const share = solids.some(isOffsetMesh) ? offsetShare : 1;
  const all = [...joined.holds, ...joined.displaces];
  return swept + share * (trianglesOf(all) + crossings(all));
}

/**
 * What long thin faces that stand askew cost, in triangles: the library looks for crossings by upright boxes, and the
 * boxes of such faces meet nearly all others. Measured: about 1.5 µs for two of them, 0.15 µs for one and a small one.
 */
function crossings(shapes: readonly PlacedShape[]): number {
  const counts = shapes.map((one) => ({ strips: stripsOf(one), all: trianglesOf([one]) }));
  return counts.reduce(
    (sum, one, i) =>
      sum +
      counts.slice(0, i).reduce((of, other) => {
        const mixed =
          one.strips * (other.all - other.strips) + other.strips * (one.all - one.strips);
        return of + 0.3 * one.strips * other.strips + 0.03 * mixed;
      }, 0),
    0,
  );
}

/** Faces as long as the solid and as narrow as a facet, where it is turned by other than right angles. */
function stripsOf({ shape, place }: PlacedShape): number {
  if (place.aligned) return 0;
  if (shape.form === 'extrusion') return shape.outline.length > 16 ? 2 * shape.outline.length : 0;
  return shape.form === 'revolution' && shape.profile.length <= 6 ? 2 * shape.facets : 0;
}

/** Triangles of all shapes; those of a prism count twice, since its long thin ones cross more of the others'. */
function trianglesOf(shapes: readonly PlacedShape[]): number {
  return shapes.reduce((sum, { shape }) => {
    if (shape.form === 'mesh') return sum + shape.mesh.triangles.length / 3;
    if (shape.form === 'extrusion') return sum + 8 * shape.outline.length;
    return sum + 2 * shape.profile.length * shape.facets;
  }, 0);
}
