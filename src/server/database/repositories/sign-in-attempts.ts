import { Op } from 'sequelize';
import type { Database } from '../connect';
import type { SignInAttemptRecord } from '../models/sign-in-attempt';
import { inTransaction } from '../transaction';

/**
 * Counts an attempt before its password is looked at, so that many at once cannot slip through
 * together. `next` is given what is kept of the account (null: nothing) and returns what to keep,
 * or null to count nothing. Returns what `next` was given.
 */
export async function countAttempt(
  database: Database,
  accountHash: string,
  next: (kept: SignInAttemptRecord | null) => Omit<SignInAttemptRecord, 'accountHash'> | null,
): Promise<SignInAttemptRecord | null> {
  return inTransaction(database, async (transaction) => {
    const found = await database.models.signInAttempts.findByPk(accountHash, {
      transaction,
      lock: transaction.LOCK.UPDATE,
    });
    const kept = found?.get({ plain: true }) ?? null;
    const attempt = next(kept === null ? null : { ...kept });
    if (attempt !== null) {
      await database.models.signInAttempts.upsert({ accountHash, ...attempt }, { transaction });
    }
    return kept;
  });
}

export async function forgetAttempts(database: Database, accountHash: string): Promise<void> {
  await database.models.signInAttempts.destroy({ where: { accountHash } });
}

export async function forgetAttemptsBefore(database: Database, time: Date): Promise<void> {
  await database.models.signInAttempts.destroy({ where: { lastAt: { [Op.lt]: time } } });
}
