import type { Solid } from '~/domain/tank/kinds/registry';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import { sizeKey } from '~/domain/tank/size-key';
import { measuredPaths } from './measured-paths';

type Own = NonNullable<TankSettings['ownSizePlusMinusMm']>;

/**
 * The ± of single sizes after solids have other names, since they are kept by name: what stood under the old name
 * stands under the new one. null where nothing has to be carried along. A solid counts as renamed when it stands in its
 * old place of the list, nothing but its name is different, and no solid has the old name any more.
 */
export function renamedPlusMinus(before: TankDocument, after: TankDocument, own: Own): Own | null {
  if (before === after || before.solids.length !== after.solids.length) return null;
  const names = new Set(after.solids.map(({ id }) => id));
  let carried: Own | null = null;
  after.solids.forEach((solid, i) => {
    const old = before.solids[i]!;
    if (old.id === solid.id || names.has(old.id) || !sameButName(old, solid)) return;
    for (const path of measuredPaths(old)) {
      const { [sizeKey(old.id, path)]: plusMinusMm, ...rest }: Own = carried ?? own;
      if (plusMinusMm === undefined) continue;
      carried = { ...rest, [sizeKey(solid.id, path)]: plusMinusMm };
    }
  });
  return carried;
}

function sameButName(one: Solid, other: Solid): boolean {
  return JSON.stringify({ ...one, id: '' }) === JSON.stringify({ ...other, id: '' });
}
