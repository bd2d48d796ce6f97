import type { TankDocument } from './document';
import { kindOf } from './kinds/registry';
import type { TankSettings } from './settings';
import { sizeKey } from './size-key';

/** How many sizes of the design have a ± of their own; keys of what is gone do not count. */
export function ownSizes(
  { solids }: Pick<TankDocument, 'solids'>,
  { ownSizePlusMinusMm = {} }: Pick<TankSettings, 'ownSizePlusMinusMm'>,
): number {
  return solids.reduce((sum, solid) => {
    const kind = kindOf(solid);
    const paths = (kind.measured?.(solid) ?? kind.sizes(solid)).map(({ path }) => path);
    return sum + paths.filter((path) => sizeKey(solid.id, path) in ownSizePlusMinusMm).length;
  }, 0);
}

/** What is said of them after the ± of all: ", 3 with their own"; nothing where there are none. */
export function ownSizesWords(
  design: Pick<TankDocument, 'solids'>,
  settings: TankSettings,
): string {
  const count = ownSizes(design, settings);
  return count === 0 ? '' : `, ${count} with ${count === 1 ? 'its' : 'their'} own`;
}
