import { Op } from 'sequelize';
import type { Database } from '../connect';
import type { SignInAttemptRecord } from '../models/sign-in-attempt';
import { inTransaction } from '../transaction';

/**
 * Counts an attempt before its password is looked at, so that many at once cannot slip through
 * together. `next` is given what is kept of the account and returns what to keep, or null to count
 * nothing. Returns what `next` was given.
 */
export async function countAttempt(
  database: Database,
  accountHash: string,
  next: (kept: SignInAttemptRecord) => Omit<SignInAttemptRecord, 'accountHash'> | null,
): Promise<SignInAttemptRecord> {
  const { sequelize, models } = database;
  return inTransaction(database, async (transaction) => {
    // makes sure of the row and locks it at once: looking first would let newcomers deadlock on the gap
    await sequelize.query(
      `INSERT INTO sign_in_attempts (account_hash, failures, last_at, blocked_until) VALUES (?, 0, ?, ?)
       ON DUPLICATE KEY UPDATE failures = failures`,
      { replacements: [accountHash, new Date(0), new Date(0)], transaction },
    );
    const found = await models.signInAttempts.findByPk(accountHash, {
      transaction,
      lock: true,
      rejectOnEmpty: true,
    });
    const kept = { ...found.get() };
    const attempt = next(kept);
    if (attempt !== null) {
      await models.signInAttempts.update(attempt, { where: { accountHash }, transaction });
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
