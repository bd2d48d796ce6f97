import type { TankDocument } from '../tank/document';
import { placedSolid, type PlacedSolid } from '../tank/placed-solid';
import type { Kind } from '../tank/kinds/kind';
import { kindOf, type Solid } from '../tank/kinds/registry';
import { valueAt } from '../tank/value-at';

/** One size of one solid, or the wall, and the ways the tank may look when it is `byMm` larger. */
export interface SizeVariant {
  sizeMm: number;
  byMm: number;
  /** The solids as drawn. */
  variants: readonly (readonly PlacedSolid[])[];
  /** The wall that comes off them; null where sizes are inside ones. */
  wallMm: number | null;
}

/**
 * Every size of the document in turn made larger by what `byOf` says of it, mm; a size of which it says 0 is
 * left out. A solid that is not turned grows from its lowest corner,
 * as the document places it. A turned one may grow from either end, since the document does not say which of
 * its faces meets the next solid: both are given, and the caller takes the one that matters more. Where sizes are
 * outside ones the thickness of the wall is one more, under the id "wall".
 */
export function sizeVariants(
  document: TankDocument,
  byOf: (solidId: string, path: readonly string[]) => number,
): SizeVariant[] {
  const whole = document.solids.map(placedSolid);
  const wallMm = document.wall?.sizes === 'outside' ? document.wall.thickness : null;
  const ofSolids = document.solids.flatMap((solid, index) =>
    measuredOf(solid).flatMap(({ path, sizeMm, grown: grownBy }) => {
      const byMm = byOf(solid.id, path);
      if (byMm === 0) return [];
      const grown = placedSolid(grownBy(byMm));
      const original = whole[index]!;
      const turned = (solid.turn ?? [0, 0, 0]).some((degrees) => degrees % 360 !== 0);
      const replacements = turned ? [1, -1].map((end) => grownFrom(original, grown, end)) : [grown];
      return [
        { sizeMm, byMm, variants: replacements.map((one) => whole.with(index, one)), wallMm },
      ];
    }),
  );
  if (wallMm === null) return ofSolids;
  const byMm = byOf('wall', ['thickness']);
  return byMm === 0
    ? ofSolids
    : [...ofSolids, { sizeMm: wallMm, byMm, variants: [whole], wallMm: wallMm + byMm }];
}

/** What was measured of a solid, and the solid with one of it larger. */
function measuredOf(solid: Solid): ReturnType<NonNullable<Kind<Solid>['measured']>> {
  const kind = kindOf(solid);
  return (
    kind.measured?.(solid) ??
    kind.sizes(solid).map(({ path }) => {
      const sizeMm = Number(valueAt(solid, path));
      return { path, sizeMm, grown: (byMm) => withSize(solid, path, sizeMm + byMm) };
    })
  );
}

/** The grown solid with its own low faces (end 1) or its own high faces (end −1) where they were. */
function grownFrom(original: PlacedSolid, grown: PlacedSolid, end: number): PlacedSolid {
  const before = original.kind.extent(original.solid);
  const after = grown.kind.extent(grown.solid);
  const half = after.map((length, axis) => (end * (length - before[axis]!)) / 2);
  const centre = original.place.centre.map(
    (value, i) =>
      value +
      original.place.rows[i]![0] * half[0]! +
      original.place.rows[i]![1] * half[1]! +
      original.place.rows[i]![2] * half[2]!,
  ) as [number, number, number];
  return { ...grown, place: { ...original.place, centre } };
}

function withSize(solid: Solid, path: readonly string[], value: number): Solid {
  const copy = structuredClone(solid) as unknown as Record<string, unknown>;
  const parent = valueAt(copy, path.slice(0, -1)) as Record<string, unknown>;
  parent[path.at(-1)!] = value;
  return copy as unknown as Solid;
}
