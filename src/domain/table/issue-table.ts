import { DipwrightError } from '../errors';
import type { TankDocument } from '../tank/document';
import type { TankSettings } from '../tank/settings';
import { checkIssuable } from './check-issuable';
import { computeInFull } from './compute-in-full';
import type { IssuedTable } from './issued-table';
import { rowsBetween } from './rows-between';
import { plusMinusOfTable } from './uncertainty';

/**
 * The table a revision freezes, with the ± of every row and closer rows where the curve between two of them would
 * be wrong by more than 1e-6 of capacity. Throws `invalid`, one fault a reason, for a design that may
 * not be issued.
 */
export async function issueTable(
  document: TankDocument,
  settings: TankSettings,
  stepMm: number,
): Promise<IssuedTable> {
  const reasons = await checkIssuable(document);
  if (reasons.length > 0) {
    const faults = reasons.map((detail) => ({ pointer: '/solids', detail }));
    throw new DipwrightError('invalid', reasons.join(' '), { faults });
  }
  const { table, space, frame } = await computeInFull(document, { stepMm });
  const asked = new Set(table.rows);
  const all = [...table.rows, ...rowsBetween(space, frame, table.rows)].sort(
    (one, other) => one.depthMm - other.depthMm,
  );
  const { rowsL, brimL } = await plusMinusOfTable(document, settings, { ...table, rows: all });
  const rows = all.map((row, i) => ({
    depthMm: row.depthMm,
    volumeL: row.volumeL,
    surfaceCm2: row.surfaceCm2,
    plusMinusL: rowsL[i]!,
    betweenRows: !asked.has(row),
  }));
  return { table, rows, brimPlusMinusL: brimL };
}
