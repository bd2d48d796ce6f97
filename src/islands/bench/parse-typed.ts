import { greatestLengthMm } from '~/domain/tank/solid';
import { formatLengthWithUnit } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { parseLength } from '~/domain/units/parse-length';
import type { Parsed } from './TypedNumber';

const greatestPlusMinusMm = 1000;

/** A size: a length above nothing, in mm. */
export function parseSize(unit: LengthUnit) {
  return (text: string): Parsed => {
    const parsed = parseLength(text, unit);
    if ('refused' in parsed) return parsed;
    if (parsed.mm <= 0) return { refused: 'A length is more than 0.' };
    return parsed.mm <= greatestLengthMm
      ? { value: parsed.mm }
      : { refused: `A length is at most ${formatLengthWithUnit(greatestLengthMm, unit)}.` };
  };
}

/** A place: a length of either sign, in mm. */
export function parsePlace(unit: LengthUnit) {
  return (text: string): Parsed => {
    const parsed = parseLength(text, unit);
    if ('refused' in parsed) return parsed;
    return Math.abs(parsed.mm) <= greatestLengthMm
      ? { value: parsed.mm }
      : { refused: `A place lies within ± ${formatLengthWithUnit(greatestLengthMm, unit)}.` };
  };
}

/** A height along the stick: 0 or more, in mm. */
export function parseHeight(unit: LengthUnit) {
  return (text: string): Parsed => {
    const parsed = parseLength(text, unit);
    if ('refused' in parsed) return parsed;
    return parsed.mm >= 0 ? { value: parsed.mm } : { refused: 'A height is 0 or more.' };
  };
}

/** The ± of a size, in mm. */
export function parsePlusMinus(unit: LengthUnit) {
  return (text: string): Parsed => {
    const parsed = parseLength(text.replace(/^\s*±\s*/, ''), unit);
    if ('refused' in parsed) return parsed;
    if (parsed.mm < 0) return { refused: 'A ± is 0 or more.' };
    return parsed.mm <= greatestPlusMinusMm
      ? { value: parsed.mm }
      : { refused: `A ± is at most ${formatLengthWithUnit(greatestPlusMinusMm, unit)}.` };
  };
}

/** A plain number between two ends, with a sentence for what lies outside them. */
export function parseBetween(low: number, high: number, sentence: string) {
  return (text: string): Parsed => {
    const plain = text
      .trim()
      .replace(/\s*[°%]$/, '')
      .replace('\u2212', '-');
    const value = /^[+-]?\d+(\.\d+)?$/.test(plain) ? Number(plain) : Number.NaN;
    return value >= low && value <= high ? { value } : { refused: sentence };
  };
}
