import { formatLengthWithUnit } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { parseLength } from '~/domain/units/parse-length';

/** Depth of liquid from the zero of the stick, or the space above it down from the top of the stick. */
export type DipMeans = 'depth' | 'space';

export type Dip =
  | { is: 'nothing' }
  /** `typedMm` is what was read, whichever way it was taken. */
  | { is: 'read'; depthMm: number; typedMm: number }
  | { is: 'asked-back'; why: string };

/** What was typed, as a depth; a reading off the stick is asked back, never computed. */
export function readDip(text: string, means: DipMeans, unit: LengthUnit, heightMm: number): Dip {
  if (text.trim() === '') return { is: 'nothing' };
  const parsed = parseLength(text, unit);
  if ('refused' in parsed) return { is: 'asked-back', why: parsed.refused };
  const typedMm = parsed.mm;
  // a stick in eighths rounds its last mark: the top itself must stay typeable
  const slack = unit === 'in' ? 25.4 / 16 : 0.05;
  if (typedMm < 0 || typedMm > heightMm + slack) {
    return { is: 'asked-back', why: outside(typedMm, means, unit, heightMm) };
  }
  const within = Math.min(typedMm, heightMm);
  return { is: 'read', depthMm: means === 'depth' ? within : heightMm - within, typedMm };
}

function outside(typedMm: number, means: DipMeans, unit: LengthUnit, heightMm: number): string {
  const said = formatLengthWithUnit(typedMm, unit);
  const top = formatLengthWithUnit(heightMm, unit);
  if (typedMm < 0) return `${said} is less than nothing: read the stick from 0 to ${top}.`;
  return means === 'depth'
    ? `${said} is above the brim: the stick ends at ${top}. Read it again, or choose “space above”.`
    : `${said} of space is more than the whole stick, ${top}. Read it again, or choose “depth”.`;
}
