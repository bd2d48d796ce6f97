import { thinMm } from '../../geometry/tolerance';
import { DipwrightError, type FieldFault } from '../errors';
import type { TankDocument } from '../tank/document';
import { kindOf, type Solid } from '../tank/kinds/registry';
import { valueAt } from '../tank/value-at';

/**
 * Throws `invalid` for what the document format allows but nobody can compute: sizes that are nothing,
 * options of a kind that contradict each other, a wall of nothing under outside sizes. Every fault is listed.
 */
export function refuseUncomputable(document: TankDocument): void {
  const faults: FieldFault[] = document.solids.flatMap((solid, index) =>
    faultsOf(solid).map(({ path, detail }) => ({
      pointer: `/solids/${index}/${path.join('/')}`,
      detail: `Solid "${solid.id}", ${path.map(placeWord).join(', ')}: ${detail}`,
    })),
  );
  if (document.wall?.sizes === 'outside') {
    if (document.wall.thickness < thinMm) {
      faults.push({
        pointer: '/wall/thickness',
        detail: `Wall, thickness: with outside sizes a wall is at least ${thinMm} mm thick.`,
      });
    }
  }
  if (faults.length > 0) throw new DipwrightError('invalid', faults[0]!.detail, { faults });
}

function faultsOf(solid: Solid): readonly { path: readonly string[]; detail: string }[] {
  const kind = kindOf(solid);
  const tooSmall = kind
    .sizes(solid)
    .filter(({ path, coordinate }) => {
      if (coordinate) return false;
      // 0 itself is the schema's to allow: the tip of a cone
      const size = Number(valueAt(solid, path));
      return size > 0 && size < thinMm;
    })
    .map(({ path }) => ({ path, detail: `a size is at least ${thinMm} mm.` }));
  return [...tooSmall, ...kind.faults(solid)];
}

/** As parseDesign names a place in a list: the first is number 1. */
function placeWord(key: string): string {
  return /^\d+$/.test(key) ? `number ${Number(key) + 1}` : key;
}
