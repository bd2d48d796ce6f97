import { Op } from 'sequelize';
import type { Database } from '../connect';
import type { SessionRecord } from '../models/session';

export async function findSession(
  database: Database,
  tokenHash: string,
): Promise<SessionRecord | null> {
  const found = await database.models.sessions.findByPk(tokenHash);
  return found?.get() ?? null;
}

export async function listSessionsOf(database: Database, userId: string): Promise<SessionRecord[]> {
  const found = await database.models.sessions.findAll({ where: { userId } });
  return found.map((session) => session.get());
}

export async function insertSession(database: Database, session: SessionRecord): Promise<void> {
  await database.models.sessions.create(session);
}

export async function moveSessionExpiry(
  database: Database,
  tokenHash: string,
  expiresAt: Date,
): Promise<void> {
  await database.models.sessions.update({ expiresAt }, { where: { tokenHash } });
}

export async function removeSession(database: Database, tokenHash: string): Promise<void> {
  await database.models.sessions.destroy({ where: { tokenHash } });
}

export async function removeSessionsOf(database: Database, userId: string): Promise<void> {
  await database.models.sessions.destroy({ where: { userId } });
}

export async function removeSessionsOverBy(database: Database, time: Date): Promise<void> {
  await database.models.sessions.destroy({ where: { expiresAt: { [Op.lte]: time } } });
}
