import type { Transaction } from 'sequelize';
import type { Database } from './connect';

const mostTries = 5;
/** Deadlock, lock wait timed out; a Galera cluster reports a lost certification as the first. */
const errnosToRetry = [1213, 1205];

/**
 * Runs `work` in one transaction: all of it is kept or none. When the database asks for it (a
 * deadlock), the whole of `work` runs again, at most five times, so `work` must do nothing that
 * lasts outside the transaction.
 */
export async function inTransaction<T>(
  database: Database,
  work: (transaction: Transaction) => Promise<T>,
): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await database.sequelize.transaction(work);
    } catch (error) {
      if (attempt >= mostTries || !mayBeRetried(error)) throw error;
      // jitter keeps two that met from meeting again
      await pause(2 ** attempt * 5 * (0.5 + Math.random()));
    }
  }
}

/** True for 1213, 1205 and SQL state 40001, wherever the driver put them. */
export function mayBeRetried(error: unknown): boolean {
  const outer = error as Nested | null;
  const seen = [outer, outer?.parent, outer?.original];
  return seen.some(
    (fault) => errnosToRetry.includes(fault?.errno ?? 0) || fault?.sqlState === '40001',
  );
}

interface Nested {
  errno?: number;
  sqlState?: string;
  parent?: Nested;
  original?: Nested;
}

function pause(milliseconds: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, milliseconds));
}
