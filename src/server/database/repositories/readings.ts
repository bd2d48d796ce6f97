import { UniqueConstraintError } from 'sequelize';
import type { ReadingRecord } from '../models/reading';
import type { Scope } from '../scope';

export async function findReadingByKey(
  scope: Scope,
  tankId: string,
  idempotencyKey: string,
): Promise<ReadingRecord | null> {
  const found = await scope.database.models.readings.findOne({
    where: { workshopId: scope.workshopId, tankId, idempotencyKey },
    transaction: scope.transaction,
  });
  return found?.get() ?? null;
}

/** Stores a reading; false when its key is already kept for this tank. */
export async function insertReading(
  scope: Scope,
  reading: Omit<ReadingRecord, 'workshopId'>,
): Promise<boolean> {
  try {
    await scope.database.models.readings.create(
      { ...reading, workshopId: scope.workshopId },
      { transaction: scope.transaction },
    );
    return true;
  } catch (error) {
    if (error instanceof UniqueConstraintError) return false;
    throw error;
  }
}

/** The last ones taken, latest first. */
export async function listReadingRecords(
  scope: Scope,
  tankId: string,
  most: number,
): Promise<ReadingRecord[]> {
  const found = await scope.database.models.readings.findAll({
    where: { workshopId: scope.workshopId, tankId },
    order: [
      ['takenAt', 'DESC'],
      ['id', 'DESC'],
    ],
    limit: most,
    transaction: scope.transaction,
  });
  return found.map((reading) => reading.get());
}
