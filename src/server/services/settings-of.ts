import type { TankSettings } from '~/domain/tank/settings';
import type { TankRecord } from '../database/models/tank';

/** A tank's settings out of its record. */
export function settingsOf(tank: TankRecord): TankSettings {
  const { liquid, densityKgPerM3, safeFillPercent, outletMm, referenceHeightMm } = tank;
  const { measuredBy, sizePlusMinusMm, ownSizePlusMinus, dipPlusMinusMm } = tank;
  return {
    liquid,
    densityKgPerM3,
    safeFillPercent,
    outletMm,
    referenceHeightMm,
    measuredBy,
    sizePlusMinusMm,
    // left out when there is none: what was issued before the field would else seem changed
    ...(ownSizePlusMinus === null
      ? {}
      : { ownSizePlusMinusMm: JSON.parse(ownSizePlusMinus) as Record<string, number> }),
    dipPlusMinusMm,
  };
}

/** Settings as a tank's record keeps them. */
export function recordOfSettings({ ownSizePlusMinusMm, ...settings }: TankSettings) {
  const ownSizePlusMinus =
    ownSizePlusMinusMm === undefined ? null : JSON.stringify(ownSizePlusMinusMm);
  return { ...settings, ownSizePlusMinus };
}

/** The settings that a revision froze. */
export function issuedSettings(revision: { settings: string }): TankSettings {
  return JSON.parse(revision.settings) as TankSettings;
}
