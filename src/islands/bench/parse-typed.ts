import type { LengthUnit } from '~/domain/units/length-unit';
import { parseLength } from '~/domain/units/parse-length';
import type { Parsed } from './TypedNumber';

/** A size: a length above nothing, in mm. */
export function parseSize(unit: LengthUnit) {
  return (text: string): Parsed => {
    const parsed = parseLength(text, unit);
    if ('refused' in parsed) return parsed;
    return parsed.mm > 0 ? { value: parsed.mm } : { refused: 'A length is more than 0.' };
  };
}

/** A place: a length of either sign, in mm. */
export function parsePlace(unit: LengthUnit) {
  return (text: string): Parsed => {
    const parsed = parseLength(text, unit);
    return 'refused' in parsed ? parsed : { value: parsed.mm };
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
