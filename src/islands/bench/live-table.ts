import type { DipTable } from '~/domain/table/answer-at';
import { curveFromRows } from '~/domain/table/curve';
import type { Preview } from '~/domain/table/preview';
import type { TankSettings } from '~/domain/tank/settings';

/** The live preview as a table that answers dips. */
export function liveTable(
  preview: Preview,
  plusMinusL: readonly number[],
  settings: TankSettings,
): DipTable {
  return {
    curve: curveFromRows(preview.rows, preview.frame.levelPerReading),
    plusMinusL,
    heightMm: preview.frame.heightMm,
    capacityL: preview.capacityL,
    settings,
  };
}
