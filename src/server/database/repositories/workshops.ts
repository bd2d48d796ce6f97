import type { Transaction } from 'sequelize';
import type { Database } from '../connect';
import type { WorkshopRecord } from '../models/workshop';

export async function insertWorkshop(
  database: Database,
  workshop: WorkshopRecord,
  transaction?: Transaction,
): Promise<void> {
  await database.models.workshops.create(workshop, { transaction });
}
