import { roundTo } from './rounding';

/** Thousands separator: narrow and not broken over a line. */
export const thinSpace = '\u202f';
/** The sign of a negative number, as wide as a plus. */
export const minus = '\u2212';

/**
 * A number for people: fixed decimals, thin spaces between thousands, a true minus sign.
 * `decimals` may be negative: −1 rounds to tens. A value that rounds to 0 has no sign.
 * Throws RangeError on a number that is not finite: say why there is none instead.
 */
export function formatNumber(value: number, decimals: number): string {
  if (!Number.isFinite(value)) throw new RangeError('a number to print must be finite');
  const rounded = roundTo(value, decimals);
  const text = Math.abs(rounded).toFixed(Math.max(0, decimals));
  const [whole = '0', fraction] = text.split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, thinSpace);
  const size = fraction === undefined ? grouped : `${grouped}.${fraction}`;
  return rounded < 0 ? `${minus}${size}` : size;
}
