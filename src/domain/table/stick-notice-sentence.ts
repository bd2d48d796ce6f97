import { formatLengthWithUnit } from '../units/format-length';
import type { LengthUnit } from '../units/length-unit';
import type { StickNotice } from './stick-notice';

/** What one stick cannot tell, in a sentence for the person who dips. */
export function stickNoticeSentence(notice: StickNotice, unit: LengthUnit): string {
  const reading = formatLengthWithUnit(notice.readingMm, unit, unit === 'in' ? undefined : 0);
  if (notice.what === 'pools') {
    return `Below ${reading} the liquid stands in ${notice.pools} pools that do not level out: a dip tells only of the pool it is taken in, and the litres hold only while all stand at one height.`;
  }
  const by = notice.by === null ? 'A solid that displaces' : `“${notice.by}”`;
  return `${by} crosses the stick at ${reading}: readings end there, though the tank holds more above it.`;
}
