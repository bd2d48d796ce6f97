import { Op } from 'sequelize';
import type { RevisionRecord } from '../models/revision';
import type { Scope } from '../scope';

/** A revision without the texts that only an issue or a print needs. */
export type RevisionHead = Omit<RevisionRecord, 'design'>;
const heavy = ['design'];

/** A tank's revisions, latest first. */
export async function listRevisionHeads(scope: Scope, tankId: string): Promise<RevisionHead[]> {
  const found = await scope.database.models.revisions.findAll({
    where: { workshopId: scope.workshopId, tankId },
    attributes: { exclude: heavy },
    order: [['number', 'DESC']],
    transaction: scope.transaction,
  });
  return found.map((revision) => revision.get());
}

/** The revision in force of each of these tanks: the one with the highest number. */
export async function currentRevisions(
  scope: Scope,
  tankIds: readonly string[],
): Promise<Map<string, RevisionHead>> {
  if (tankIds.length === 0) return new Map();
  const { revisions } = scope.database.models;
  const where = { workshopId: scope.workshopId, tankId: [...tankIds] };
  const numbers = await revisions.findAll({
    where,
    attributes: ['tankId', 'number'],
    transaction: scope.transaction,
  });
  const highest = new Map<string, number>();
  for (const revision of numbers) {
    const { tankId, number } = revision.get();
    highest.set(tankId, Math.max(number, highest.get(tankId) ?? 0));
  }
  if (highest.size === 0) return new Map();
  const found = await revisions.findAll({
    where: {
      workshopId: scope.workshopId,
      [Op.or]: [...highest].map(([tankId, number]) => ({ tankId, number })),
    },
    attributes: { exclude: heavy },
    transaction: scope.transaction,
  });
  return new Map(found.map((revision) => [revision.get().tankId, revision.get()]));
}

export async function currentRevision(scope: Scope, tankId: string): Promise<RevisionHead | null> {
  return (await currentRevisions(scope, [tankId])).get(tankId) ?? null;
}

export async function findRevision(scope: Scope, id: string): Promise<RevisionRecord | null> {
  const found = await scope.database.models.revisions.findOne({
    where: { workshopId: scope.workshopId, id },
    transaction: scope.transaction,
  });
  return found?.get() ?? null;
}

export async function insertRevision(
  scope: Scope,
  revision: Omit<RevisionRecord, 'workshopId'>,
): Promise<void> {
  await scope.database.models.revisions.create(
    { ...revision, workshopId: scope.workshopId },
    { transaction: scope.transaction },
  );
}
