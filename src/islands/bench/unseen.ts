import { plusMinusAt, type DipTable } from '~/domain/table/answer-at';
import { formatVolumeWithPlusMinus } from '~/domain/units/format-volume';
import type { VolumeUnit } from '~/domain/units/volume-unit';

/** Less than this share of the brim is not worth a word. */
const leastShare = 0.001;

/**
 * What stands below the stick's zero or above its end, in one sentence; null when the stick sees
 * the whole tank. Whoever dips 0 there would take a tank that holds liquid for an empty one.
 */
export function unseenWords(table: DipTable, volume: VolumeUnit): string | null {
  const { volumeL } = table.curve;
  const belowL = volumeL[0] ?? 0;
  const aboveL = table.capacityL - (volumeL[volumeL.length - 1] ?? 0);
  const least = leastShare * table.capacityL;
  const written = (litres: number, atMm: number) =>
    formatVolumeWithPlusMinus(litres, volume, plusMinusAt(table, atMm));
  const parts = [
    belowL > least ? `${written(belowL, 0)} lie below its zero` : null,
    aboveL > least ? `${written(aboveL, table.heightMm)} above its end` : null,
  ].filter((part) => part !== null);
  if (parts.length === 0) return null;
  return `The stick does not see the whole tank: ${parts.join(', ')}. Move it to where the tank is deepest, if it can stand there.`;
}
