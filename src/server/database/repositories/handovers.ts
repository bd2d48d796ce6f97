import type { HandoverRecord } from '../models/handover';
import type { Scope } from '../scope';

export async function listHandoverRecords(scope: Scope, tankId: string): Promise<HandoverRecord[]> {
  const found = await scope.database.models.handovers.findAll({
    where: { workshopId: scope.workshopId, tankId },
    order: [
      ['handedOverAt', 'ASC'],
      ['userId', 'ASC'],
    ],
    transaction: scope.transaction,
  });
  return found.map((handover) => handover.get());
}

/** The tanks that were handed over to this owner. */
export async function tankIdsHandedOverTo(scope: Scope, userId: string): Promise<string[]> {
  const found = await scope.database.models.handovers.findAll({
    where: { workshopId: scope.workshopId, userId },
    attributes: ['tankId'],
    transaction: scope.transaction,
  });
  return found.map((handover) => handover.get().tankId);
}

export async function isHandedOver(scope: Scope, tankId: string, userId: string): Promise<boolean> {
  const found = await scope.database.models.handovers.findOne({
    where: { workshopId: scope.workshopId, tankId, userId },
    transaction: scope.transaction,
  });
  return found !== null;
}

/** Handing over twice keeps the first. */
export async function insertHandover(
  scope: Scope,
  handover: Omit<HandoverRecord, 'workshopId'>,
): Promise<void> {
  const { tankId, userId } = handover;
  await scope.database.models.handovers.findOrCreate({
    where: { tankId, userId },
    defaults: { ...handover, workshopId: scope.workshopId },
    transaction: scope.transaction,
  });
}
