import { Op } from 'sequelize';
import type { Scope } from '../scope';
import type { RevisionHead } from './revisions';

/** The drafts' designs by tank, as stored. */
export async function draftDesigns(
  scope: Scope,
  tankIds: readonly string[],
): Promise<Map<string, string>> {
  const found = await scope.database.models.drafts.findAll({
    where: { workshopId: scope.workshopId, tankId: [...tankIds] },
    attributes: ['tankId', 'design'],
    transaction: scope.transaction,
  });
  return new Map(found.map((draft) => [draft.get().tankId, draft.get().design]));
}

/** Which of these tanks were handed over to anybody. */
export async function handedOverAmong(
  scope: Scope,
  tankIds: readonly string[],
): Promise<Set<string>> {
  const found = await scope.database.models.handovers.findAll({
    where: { workshopId: scope.workshopId, tankId: [...tankIds] },
    attributes: ['tankId'],
    transaction: scope.transaction,
  });
  return new Set(found.map((handover) => handover.get().tankId));
}

/**
 * ± of the brim of each of these revisions, litres, by revision: as frozen with it; of one that was issued before
 * that was frozen, the ± of its last row.
 */
export async function brimsPlusMinus(
  scope: Scope,
  revisions: readonly RevisionHead[],
): Promise<Map<string, number>> {
  const known = revisions.flatMap(({ id, brimPlusMinusL }) =>
    brimPlusMinusL === null ? [] : [[id, brimPlusMinusL] as const],
  );
  const older = revisions.filter(({ brimPlusMinusL }) => brimPlusMinusL === null);
  if (older.length === 0) return new Map(known);
  const found = await scope.database.models.strappingRows.findAll({
    where: {
      [Op.or]: older.map(({ id, rowCount }) => ({ revisionId: id, rowNo: rowCount - 1 })),
    },
    attributes: ['revisionId', 'plusMinusL'],
    transaction: scope.transaction,
  });
  return new Map([
    ...known,
    ...found.map((row) => [row.get().revisionId, row.get().plusMinusL] as const),
  ]);
}
