import type { IssuedRow } from '~/domain/table/request';
import type { Scope } from '../scope';

const rowsAtOnce = 1_000;

/** Writes a table, in order, a thousand rows to the statement. */
export async function insertRows(
  scope: Scope,
  revisionId: string,
  rows: readonly IssuedRow[],
): Promise<void> {
  for (let first = 0; first < rows.length; first += rowsAtOnce) {
    await scope.database.models.strappingRows.bulkCreate(
      rows
        .slice(first, first + rowsAtOnce)
        .map(({ depthMm, volumeL, surfaceCm2, plusMinusL }, index) => ({
          revisionId,
          rowNo: first + index,
          depthMm,
          volumeL,
          surfaceCm2,
          plusMinusL,
        })),
      { transaction: scope.transaction },
    );
  }
}

/** The rows as issued. Ask only for a revision that was found in this workshop. */
export async function listRows(scope: Scope, revisionId: string): Promise<IssuedRow[]> {
  const found = await scope.database.models.strappingRows.findAll({
    where: { revisionId },
    order: [['rowNo', 'ASC']],
    attributes: ['depthMm', 'volumeL', 'surfaceCm2', 'plusMinusL'],
    raw: true,
    transaction: scope.transaction,
  });
  return found as unknown as IssuedRow[];
}
