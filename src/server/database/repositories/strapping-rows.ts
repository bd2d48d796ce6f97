import type { KeptRow } from '~/domain/table/request';
import type { Scope } from '../scope';

const rowsAtOnce = 1_000;

/** Writes a table, in order, a thousand rows to the statement. */
export async function insertRows(
  scope: Scope,
  revisionId: string,
  rows: readonly KeptRow[],
): Promise<void> {
  for (let first = 0; first < rows.length; first += rowsAtOnce) {
    await scope.database.models.strappingRows.bulkCreate(
      rows
        .slice(first, first + rowsAtOnce)
        .map(({ depthMm, volumeL, surfaceCm2, plusMinusL, betweenRows }, index) => ({
          revisionId,
          rowNo: first + index,
          depthMm,
          volumeL,
          surfaceCm2,
          plusMinusL,
          betweenRows,
        })),
      { transaction: scope.transaction },
    );
  }
}

/** The rows as kept, those between the printed ones too. Ask only for a revision that was found in this workshop. */
export async function listRows(scope: Scope, revisionId: string): Promise<KeptRow[]> {
  const found = await scope.database.models.strappingRows.findAll({
    where: { revisionId },
    order: [['rowNo', 'ASC']],
    attributes: ['depthMm', 'volumeL', 'surfaceCm2', 'plusMinusL', 'betweenRows'],
    raw: true,
    transaction: scope.transaction,
  });
  // raw rows carry the column as MariaDB has it: 0 or 1
  return (found as unknown as (Omit<KeptRow, 'betweenRows'> & { betweenRows: unknown })[]).map(
    (row) => ({ ...row, betweenRows: Boolean(row.betweenRows) }),
  );
}
