import type { DraftRecord } from '../models/draft';
import type { Scope } from '../scope';

export async function findDraft(scope: Scope, tankId: string): Promise<DraftRecord | null> {
  const found = await scope.database.models.drafts.findOne({
    where: { workshopId: scope.workshopId, tankId },
    transaction: scope.transaction,
  });
  return found?.get() ?? null;
}

/** Hashes of the drafts' designs by tank, without the designs themselves. */
export async function designHashes(
  scope: Scope,
  tankIds: readonly string[],
): Promise<Map<string, string>> {
  const found = await scope.database.models.drafts.findAll({
    where: { workshopId: scope.workshopId, tankId: [...tankIds] },
    attributes: ['tankId', 'designHash'],
    transaction: scope.transaction,
  });
  return new Map(found.map((draft) => [draft.get().tankId, draft.get().designHash]));
}

export async function insertDraft(
  scope: Scope,
  draft: Omit<DraftRecord, 'workshopId'>,
): Promise<void> {
  await scope.database.models.drafts.create(
    { ...draft, workshopId: scope.workshopId },
    { transaction: scope.transaction },
  );
}

/**
 * Saves over exactly the version that was read and gives it the next number, also when nothing in
 * it differs. False when another save came first.
 */
export async function replaceDraft(
  scope: Scope,
  tankId: string,
  version: number,
  draft: Pick<DraftRecord, 'design' | 'designHash' | 'savedBy' | 'savedAt'>,
): Promise<boolean> {
  const [changed] = await scope.database.models.drafts.update(
    { ...draft, version: version + 1 },
    { where: { workshopId: scope.workshopId, tankId, version }, transaction: scope.transaction },
  );
  return changed === 1;
}
