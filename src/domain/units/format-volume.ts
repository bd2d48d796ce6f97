import { formatNumber } from './format-number';
import { decimalsFor } from './rounding';
import { litresPerVolumeUnit, volumeUnitSigns, type VolumeUnit } from './volume-unit';

/**
 * A volume for people, without its unit, with no more digits than its ± deserves (see
 * `decimalsFor`). A volume at or below its own ± still shows its digits.
 *
 * @param litres the figure
 * @param plusMinusL its ±, litres (half of a 95 % interval)
 */
export function formatVolume(litres: number, unit: VolumeUnit, plusMinusL: number): string {
  const size = litresPerVolumeUnit[unit];
  return formatNumber(litres / size, decimalsFor(plusMinusL / size));
}

/** The ± alone, rounded by the same rule: `1.4`, `0.9`, `12`. */
export function formatPlusMinus(plusMinusL: number, unit: VolumeUnit): string {
  const size = litresPerVolumeUnit[unit];
  return formatNumber(plusMinusL / size, decimalsFor(plusMinusL / size));
}

/** Figure, ± and unit: `123.0 ± 1.4 L`, `47.55 ± 0.12 US gal`. */
export function formatVolumeWithPlusMinus(
  litres: number,
  unit: VolumeUnit,
  plusMinusL: number,
): string {
  const figure = formatVolume(litres, unit, plusMinusL);
  return `${figure}\u00a0±\u00a0${formatPlusMinus(plusMinusL, unit)}\u00a0${volumeUnitSigns[unit]}`;
}
