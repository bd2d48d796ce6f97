import type { DipTable } from '~/domain/table/answer-at';
import { curveFromRows } from '~/domain/table/curve';
import type { Preview } from '~/domain/table/preview';
import type { PlusMinus } from '~/domain/table/uncertainty';
import type { TankSettings } from '~/domain/tank/settings';

export interface LiveTable extends DipTable {
  /** ± of the whole liquid space, litres; nobody dips a brim. */
  brimPlusMinusL: number;
}

/** The live preview as a table that answers dips. */
export function liveTable(
  preview: Preview,
  { rowsL, brimL }: PlusMinus,
  settings: TankSettings,
): LiveTable {
  return {
    curve: curveFromRows(preview.rows, preview.frame.levelPerReading),
    plusMinusL: rowsL,
    brimPlusMinusL: brimL,
    heightMm: preview.frame.heightMm,
    capacityL: preview.capacityL,
    settings,
  };
}
