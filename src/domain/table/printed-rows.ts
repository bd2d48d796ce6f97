import type { IssuedRow, KeptRow } from './request';

/** The rows that were asked for: what charts, files and the API print. The closer ones stay inside. */
export function printedRows(rows: readonly KeptRow[]): IssuedRow[] {
  return rows
    .filter(({ betweenRows }) => !betweenRows)
    .map(({ depthMm, volumeL, surfaceCm2, plusMinusL }) => ({
      depthMm,
      volumeL,
      surfaceCm2,
      plusMinusL,
    }));
}
