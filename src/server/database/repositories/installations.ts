import type { Installation } from '~/domain/installation/installation';
import type { InstallationRecord } from '../models/installation';
import type { Scope } from '../scope';

/** Installations of the workshop by name; with `only`, those of these ids. */
export async function listInstallationRecords(
  scope: Scope,
  only?: readonly string[],
): Promise<Installation[]> {
  const found = await scope.database.models.installations.findAll({
    where: { workshopId: scope.workshopId, ...(only === undefined ? {} : { id: [...only] }) },
    order: [
      ['name', 'ASC'],
      ['id', 'ASC'],
    ],
    transaction: scope.transaction,
  });
  return found.map((installation) => {
    const { id, name, kind } = installation.get();
    return { id, name, kind };
  });
}

export async function findInstallation(
  scope: Scope,
  id: string,
): Promise<InstallationRecord | null> {
  const found = await scope.database.models.installations.findOne({
    where: { workshopId: scope.workshopId, id },
    transaction: scope.transaction,
  });
  return found?.get() ?? null;
}

export async function insertInstallation(
  scope: Scope,
  installation: Omit<InstallationRecord, 'workshopId'>,
): Promise<void> {
  await scope.database.models.installations.create(
    { ...installation, workshopId: scope.workshopId },
    { transaction: scope.transaction },
  );
}
