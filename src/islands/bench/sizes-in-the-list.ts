import { kindOf, type Solid } from '~/domain/tank/kinds/registry';
import { hasMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { valueAt } from '~/domain/tank/value-at';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';

/** Sizes that still read as sizes when they stand in a row. */
const fewSizes = 4;

/**
 * The sizes of a solid for its row of the list: one after the other in the person's unit; where they have parts or are
 * many, in words, which are in mm and say so where that is not the unit.
 */
export function sizesInTheList(solid: Solid, unit: LengthUnit): string {
  if (solid.kind === 'mesh' && !hasMesh(solid.upload)) return '';
  const kind = kindOf(solid);
  const sizes = kind.sizes(solid);
  const inParts = sizes.some(({ path }) => path.length > 1);
  if (sizes.length > fewSizes || (inParts && unit === 'mm')) {
    return unit === 'mm' ? kind.words(solid) : `${kind.words(solid)} mm`;
  }
  const lengths =
    sizes.length === 0 ? kind.extent(solid) : sizes.map(({ path }) => Number(valueAt(solid, path)));
  return lengths.map((length) => formatLength(length, unit)).join(' × ');
}
