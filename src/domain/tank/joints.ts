import { unionOf, without, type Interval } from '../../geometry/intervals';
import { meshLess, meshOf } from '../../geometry/manifold';
import type { Mesh } from '../../geometry/mesh';
import { withoutCrumbs } from '../../geometry/without-crumbs';
import { meshChords } from '../../geometry/mesh-chords';
import { placing, toTank, type Placing } from '../../geometry/placing';
import type { Bounds } from '../../geometry/shape-bounds';
import { samePlaceMm } from '../../geometry/tolerance';
import { wallPieces } from '../../geometry/wall-pieces';
import type { Kind } from './kinds/kind';
import type { Solid } from './kinds/registry';
import { chordsOf, highestLevel, placedShape, type PlacedSolid } from './placed-solid';
import type { Vec3 } from './solid';

/** Most chords to a turn of the rounding along a re-entrant joint. */
const mostArcFacets = 32;

/**
 * Chords to a turn of a round solid that is all wall: it is narrower than two walls, and what matters of it is
 * only its mouth.
 */
const eatenFacets = 24;

/** Loose bits below this part of a cube of the wall are rounding between its pieces, not liquid space. */
const crumb = 0.05;

/** Facets to a turn of the mesh that a line through a joint is looked up in. */
const lookUpFacets = 64;

/**
 * The liquid space near the joints of solids that hold: no wall stands between solids that join, so there the
 * inside of all together is more than the insides of each. A point inside all together but no single one has
 * a place where two solids meet within `wallMm`; so it lies in a box about the common part of two, that much larger.
 * In those boxes the union itself is offset, as a mesh. A solid of its own, which holds; null when no two come
 * near each other. Needs loadManifold() first.
 *
 * @param drawn the solids that hold, as drawn
 * @param left what is left of each of them inside the wall
 */
export function joints(
  drawn: readonly PlacedSolid[],
  left: readonly PlacedSolid[],
  wallMm: number,
): PlacedSolid | null {
  const boxes = drawn.map(boundsOf);
  const meeting = boxes.flatMap((one, i) =>
    boxes.slice(0, i).flatMap((other) => common(one, other, wallMm) ?? []),
  );
  if (meeting.length === 0) return null;
  const middle = [0, 1, 2].map((axis) =>
    Math.round((meeting[0]!.low[axis]! + meeting[0]!.high[axis]!) / 2),
  ) as [number, number, number];
  const near = meeting.map(({ low, high }) => ({
    low: minus(low, middle),
    high: minus(high, middle),
  }));
  const round = drawn.some(({ kind, solid }) => kind.curved(solid));
  const balls = drawn.some(({ kind, solid }) => kind.curved(solid) === 'twice');
  const aligned = drawn.every(({ place }) => place.aligned);
  const place: Placing = { ...placing(middle, [0, 0, 0], [0, 0, 0]), aligned };

  const made = new Map<number, Mesh>();
  const meshAt = (facets: number): Mesh => {
    const known = made.get(facets);
    if (known) return known;
    const chord = (2 * Math.PI) / (round ? Math.min(facets, mostArcFacets) : mostArcFacets);
    const mesh = meshLess(
      drawn.map((one) => {
        const counted = left.some((inside) => inside.drawn === one)
          ? facets
          : Math.min(facets, eatenFacets);
        return meshOf(placedShape(one, counted), middle);
      }),
      near,
      (whole) => wallPieces(whole, wallMm, chord, near),
    );
    const sound = withoutCrumbs(mesh, crumb * wallMm ** 3);
    made.set(facets, sound);
    return sound;
  };
  let lookUp: ReturnType<typeof meshChords> | undefined;
  const standOff = round
    ? (4 * Math.max(...drawn.flatMap(({ kind, solid }) => kind.extent(solid)))) / lookUpFacets ** 2
    : samePlaceMm;

  const kind: Kind<Solid> = {
    ...drawn[0]!.kind,
    label: 'joints',
    curved: () => (balls ? 'twice' : round ? 'once' : false),
    extent: () => drawn[0]!.kind.extent(drawn[0]!.solid),
    shape: (_solid, facets) => ({ form: 'mesh', mesh: meshAt(facets) }),
    // where the insides reach as far, their own closed form speaks; where they do not, the mesh is asked
    support: () => -Infinity,
    chords(_solid, line, slack): readonly Interval[] {
      lookUp ??= meshChords(meshAt(lookUpFacets));
      const found = lookUp(line, slack);
      if (found.length === 0) return [];
      const inTank = {
        origin: toTank({ ...place, aligned: false }, line.origin),
        direction: line.direction,
      };
      const others = left.flatMap((one) => chordsOf(one, inTank, slack));
      const ends = others.flatMap(({ from, to }) => [from, to]);
      const agreed = (mm: number) => ends.find((end) => Math.abs(end - mm) <= standOff) ?? mm;
      return found
        .map(({ from, to }) => ({ from: agreed(from), to: agreed(to) }))
        .filter(({ from, to }) => without([{ from, to }], unionOf(others), standOff).length > 0);
    },
    volume: () => 0,
    faults: () => [],
  };
  return { solid: { ...drawn[0]!.solid, id: '' }, kind, place, drawn: drawn[0]! };
}

/** Whether a solid is what joints() made. */
export function isJoints({ solid }: PlacedSolid): boolean {
  return solid.id === '';
}

function boundsOf(one: PlacedSolid): Bounds {
  const reach = (direction: Vec3) => highestLevel(one, direction);
  return {
    low: [-reach([-1, 0, 0]), -reach([0, -1, 0]), -reach([0, 0, -1])],
    high: [reach([1, 0, 0]), reach([0, 1, 0]), reach([0, 0, 1])],
  };
}

/** The box that two boxes have in common or touch in, `mm` larger on every side. */
function common(one: Bounds, other: Bounds, mm: number): Bounds | null {
  const low = one.low.map((value, axis) => Math.max(value, other.low[axis]!));
  const high = one.high.map((value, axis) => Math.min(value, other.high[axis]!));
  if (low.some((value, axis) => value > high[axis]! + samePlaceMm)) return null;
  return {
    low: low.map((value) => value - mm) as [number, number, number],
    high: high.map((value) => value + mm) as [number, number, number],
  };
}

function minus(a: Vec3, b: Vec3): [number, number, number] {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
}
