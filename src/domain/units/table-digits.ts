import { formatNumber } from './format-number';
import { decimalsFor, roundTo } from './rounding';
import { litresPerVolumeUnit, type VolumeUnit } from './volume-unit';

/**
 * How one table writes its volumes and masses. One number of decimals for the whole of it, the one
 * that the largest ± of its rows deserves: columns stay straight and no figure claims too much.
 */
export interface TableDigits {
  volume(litres: number): string;
  /** Rounded up, so that the printed ± never promises more than the computed one. */
  plusMinus(litres: number): string;
  mass(kg: number): string;
}

/** @param largestPlusMinusL the largest ± of the rows, litres */
export function tableDigits(
  unit: VolumeUnit,
  largestPlusMinusL: number,
  densityKgPerM3: number,
): TableDigits {
  const size = litresPerVolumeUnit[unit];
  const decimals = decimalsFor(largestPlusMinusL / size);
  const massDecimals = decimalsFor((largestPlusMinusL * densityKgPerM3) / 1000, 0);
  return {
    volume: (litres) => formatNumber(litres / size, decimals),
    plusMinus: (litres) => formatNumber(roundUp(litres / size, decimals), decimals),
    mass: (kg) => formatNumber(kg, massDecimals),
  };
}

/** Up to the last printed digit, at least one of it: a printed figure is itself rounded. */
function roundUp(value: number, decimals: number): number {
  const digit = 10 ** -decimals;
  const nearest = roundTo(value, decimals);
  return Math.max(digit, nearest >= value - digit * 1e-6 ? nearest : nearest + digit);
}
