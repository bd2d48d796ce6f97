import { formatNumber } from '../units/format-number';
import type { TankSettings } from '../tank/settings';
import { liquids } from './liquids';

/** What the kilograms rest on: "Kilograms: diesel of 840 kg per m³." */
export function densitySentence({
  liquid,
  densityKgPerM3,
}: Pick<TankSettings, 'liquid' | 'densityKgPerM3'>): string {
  const entry = liquids[liquid];
  const density = densityKgPerM3 ?? entry.densityKgPerM3;
  if (density === null) return 'Kilograms are not known: the density of this liquid was not typed.';
  const name = liquid === 'other' ? 'this liquid' : entry.name.toLowerCase();
  return `Kilograms: ${name} of ${formatNumber(density, density % 1 === 0 ? 0 : 1)}\u00a0kg\u00a0per\u00a0m³.`;
}
