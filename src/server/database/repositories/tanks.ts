import type { TankRecord } from '../models/tank';
import type { Scope } from '../scope';

/** Tanks of the workshop by name; with `only`, those of these ids. */
export async function listTankRecords(
  scope: Scope,
  only?: readonly string[],
): Promise<TankRecord[]> {
  const found = await scope.database.models.tanks.findAll({
    where: { workshopId: scope.workshopId, ...(only === undefined ? {} : { id: [...only] }) },
    order: [
      ['name', 'ASC'],
      ['id', 'ASC'],
    ],
    transaction: scope.transaction,
  });
  return found.map((tank) => tank.get());
}

/** `lock`: until the transaction ends, nobody else issues or changes this tank. */
export async function findTank(
  scope: Scope,
  id: string,
  options: { lock?: boolean } = {},
): Promise<TankRecord | null> {
  const found = await scope.database.models.tanks.findOne({
    where: { workshopId: scope.workshopId, id },
    transaction: scope.transaction,
    ...(options.lock === true ? { lock: true } : {}),
  });
  return found?.get() ?? null;
}

export async function insertTank(
  scope: Scope,
  tank: Omit<TankRecord, 'workshopId'>,
): Promise<void> {
  await scope.database.models.tanks.create(
    { ...tank, workshopId: scope.workshopId },
    { transaction: scope.transaction },
  );
}

export async function updateTank(
  scope: Scope,
  id: string,
  change: Partial<Omit<TankRecord, 'id' | 'workshopId' | 'createdBy' | 'createdAt'>>,
): Promise<void> {
  await scope.database.models.tanks.update(change, {
    where: { workshopId: scope.workshopId, id },
    transaction: scope.transaction,
  });
}
