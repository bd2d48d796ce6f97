import type { IssuedRow } from '~/domain/table/request';
import type { TankSettings } from '~/domain/tank/settings';
import { packRows } from '~/islands/tank-card/packed-rows';

/**
 * A cistern with a sloped floor, worked by hand: inside 900 × 500, flat for 100 mm at the deep end,
 * then rising 60 mm over 800; 300 deep there. Litres at h mm:
 * V = 0.05 h + h²/300 up to 60 mm, 15 + 0.45 (h − 60) above. Brim 123.0.
 */
function rowAt(depthMm: number): IssuedRow {
  const low = depthMm <= 60;
  return {
    depthMm,
    volumeL: low ? 0.05 * depthMm + depthMm ** 2 / 300 : 15 + 0.45 * (depthMm - 60),
    surfaceCm2: (low ? 0.05 + depthMm / 150 : 0.45) * 1e4,
    plusMinusL: 0.9,
  };
}

export const rows = Array.from({ length: 61 }, (_, i) => rowAt(5 * i));

export const settings: TankSettings = {
  liquid: 'drinking-water',
  densityKgPerM3: null,
  safeFillPercent: 100,
  outletMm: null,
  referenceHeightMm: null,
  measuredBy: 'tape',
  sizePlusMinusMm: 2,
  dipPlusMinusMm: 2,
};

export const cistern = {
  tankId: 'cistern',
  person: 'callum',
  revision: { letter: 'A', heightMm: 300, capacityL: 123 },
  settings,
  rows: packRows(rows),
  slopeFactor: 1,
  readings: [],
  mayKeep: true,
};
