import { DipwrightError } from '../errors';
import type { TankDocument } from '../tank/document';
import type { TankSettings } from '../tank/settings';
import { checkIssuable } from './check-issuable';
import { computeTable } from './compute-table';
import type { IssuedTable } from './issued-table';
import { plusMinusOfRows } from './uncertainty';

/** The table a revision freezes, with the ± of every row. Throws `invalid`, one fault a reason, for a design that may not be issued. */
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
  const table = await computeTable(document, { stepMm });
  const plusMinus = await plusMinusOfRows(document, settings, table);
  const rows = table.rows.map(({ depthMm, volumeL, surfaceCm2 }, i) => ({
    depthMm,
    volumeL,
    surfaceCm2,
    plusMinusL: plusMinus[i]!,
  }));
  return { table, rows };
}
