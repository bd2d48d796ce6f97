import type { Scope } from '../scope';

/** The drafts' designs by tank, as stored. */
export async function draftDesigns(scope: Scope, tankIds: readonly string[]): Promise<Map<string, string>> {
  const found = await scope.database.models.drafts.findAll({
    where: { workshopId: scope.workshopId, tankId: [...tankIds] },
    attributes: ['tankId', 'design'],
    transaction: scope.transaction,
  });
  return new Map(found.map((draft) => [draft.get().tankId, draft.get().design]));
}

/** Which of these tanks were handed over to anybody. */
export async function handedOverAmong(scope: Scope, tankIds: readonly string[]): Promise<Set<string>> {
  const found = await scope.database.models.handovers.findAll({
    where: { workshopId: scope.workshopId, tankId: [...tankIds] },
    attributes: ['tankId'],
    transaction: scope.transaction,
  });
  return new Set(found.map((handover) => handover.get().tankId));
}
