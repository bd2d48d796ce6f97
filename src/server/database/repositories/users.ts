import { UniqueConstraintError, type Transaction } from 'sequelize';
import { DipwrightError } from '~/domain/errors';
import type { Database } from '../connect';
import type { UserRecord } from '../models/user';

export async function findUser(database: Database, id: string): Promise<UserRecord | null> {
  const found = await database.models.users.findByPk(id);
  return found?.get() ?? null;
}

export async function findUserByEmail(
  database: Database,
  email: string,
): Promise<UserRecord | null> {
  const found = await database.models.users.findOne({ where: { email } });
  return found?.get() ?? null;
}

/** Throws `conflict` when the address already has an account. */
export async function insertUser(
  database: Database,
  user: UserRecord,
  transaction?: Transaction,
): Promise<void> {
  try {
    await database.models.users.create(user, { transaction });
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const detail = 'This address already has an account: sign in, or give another address.';
    throw new DipwrightError('conflict', detail, { faults: [{ pointer: '/email', detail }] });
  }
}

/** Names of people by id, for "by whom". */
export async function namesOfUsers(
  database: Database,
  ids: readonly string[],
  transaction?: Transaction,
): Promise<Map<string, string>> {
  const wanted = [...new Set(ids)];
  if (wanted.length === 0) return new Map();
  const found = await database.models.users.findAll({ where: { id: wanted }, transaction });
  return new Map(found.map((user) => [user.get().id, user.get().name]));
}
