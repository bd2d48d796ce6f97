import type { TankSettings } from '~/domain/tank/settings';
import type { TankRecord } from '../database/models/tank';

/** A tank's settings out of its record. */
export function settingsOf(tank: TankRecord): TankSettings {
  const { liquid, densityKgPerM3, safeFillPercent, outletMm, referenceHeightMm } = tank;
  const { measuredBy, sizePlusMinusMm, dipPlusMinusMm } = tank;
  return {
    liquid,
    densityKgPerM3,
    safeFillPercent,
    outletMm,
    referenceHeightMm,
    measuredBy,
    sizePlusMinusMm,
    dipPlusMinusMm,
  };
}

/** The settings that a revision froze. */
export function issuedSettings(revision: { settings: string }): TankSettings {
  return JSON.parse(revision.settings) as TankSettings;
}
