import { formatNumber } from './format-number';
import { decimalsFor } from './rounding';

/**
 * Kilograms for people, without the unit: whole ones, or coarser where the ± of the litres asks
 * for it. A density on the list is a round figure, so no tenths.
 *
 * @param plusMinusKg ± of the litres times the density
 */
export function formatMass(kg: number, plusMinusKg: number): string {
  return formatNumber(kg, decimalsFor(plusMinusKg, 0));
}
