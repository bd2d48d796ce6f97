import type { Preview } from '~/domain/table/preview';
import { stickNoticeSentence } from '~/domain/table/stick-notice-sentence';
import type { LengthUnit } from '~/domain/units/length-unit';

/** All that is worth reading about a tank before it is issued, in the reader's units. */
export function noticesOf(preview: Preview | null, unit: LengthUnit): string[] {
  if (preview === null) return [];
  const ofStick = preview.stickNotices.map((notice) => stickNoticeSentence(notice, unit));
  return [...preview.notices, ...ofStick];
}
