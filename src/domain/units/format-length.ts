import { formatNumber, minus } from './format-number';
import { mmPerInch, mmPerLengthUnit, type LengthUnit } from './length-unit';

const mostDecimals = { mm: 2, cm: 3 } as const;

/**
 * A length for people, without its unit: `412`, `412.75`, `41.2`, `16 4/8`.
 * Inches are always whole inches and eighths, rounded to the nearest eighth, never reduced: that is
 * how a stick is read. mm and cm show what is there (at most 0.01 mm) unless `decimals` is given.
 */
export function formatLength(mm: number, unit: LengthUnit, decimals?: number): string {
  if (unit === 'in') return inEighths(mm / mmPerInch);
  const value = mm / mmPerLengthUnit[unit];
  if (decimals !== undefined) return formatNumber(value, decimals);
  const text = formatNumber(value, mostDecimals[unit]);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** The same with its unit, for a sentence: `412 mm`, `16 4/8 in`. */
export function formatLengthWithUnit(mm: number, unit: LengthUnit, decimals?: number): string {
  return `${formatLength(mm, unit, decimals)}\u00a0${unit}`;
}

function inEighths(inches: number): string {
  const total = Math.round(Math.abs(inches) * 8);
  const whole = Math.floor(total / 8);
  const eighths = total % 8;
  const sign = inches < 0 && total > 0 ? minus : '';
  if (eighths === 0) return `${sign}${formatNumber(whole, 0)}`;
  return whole === 0 ? `${sign}${eighths}/8` : `${sign}${formatNumber(whole, 0)} ${eighths}/8`;
}
