/**
 * How many decimals a figure deserves by its ±: the place of the last digit of the ± after it was
 * rounded by the rule of the Particle Data Group (Review of Particle Physics, introduction,
 * "Rounding"; from memory): when the three leading digits of the ± lie between 100 and 354 it keeps
 * two digits, between 355 and 949 one, and from 950 it is rounded up to 1000 and keeps two.
 * So ± 1.4 and ± 3.4 give tenths, ± 0.97 tenths (it is written 1.0), ± 4 whole units, ± 36 tens.
 *
 * @param plusMinus half-width of the interval, ≥ 0, in the unit that is printed
 * @param most decimals are never more than this, however small the ± (2 when left out)
 * @returns decimals; negative for tens, hundreds …
 */
export function decimalsFor(plusMinus: number, most = 2): number {
  if (!(plusMinus > 0)) return most;
  const exponent = Math.floor(Math.log10(plusMinus) + 1e-12);
  const leading = Math.round((plusMinus / 10 ** exponent) * 100);
  const place = leading <= 354 ? exponent - 1 : exponent;
  return Math.min(most, 0 - place);
}

/** Rounds to a number of decimals, halves away from zero, without the surprises of binary (1.005 → 1.01). */
export function roundTo(value: number, decimals: number): number {
  if (!Number.isFinite(value)) return value;
  const sign = value < 0 ? -1 : 1;
  const size = Math.abs(value);
  const shifted = Number(shift(size, decimals));
  const rounded = Math.round(shifted + shifted * Number.EPSILON);
  return sign * Number(shift(rounded, -decimals));
}

/** Moves the decimal point as text does: exact for what can be printed. */
function shift(value: number, places: number): string {
  const [digits = '0', exponent = '0'] = String(value).split('e');
  return `${digits}e${Number(exponent) + places}`;
}
