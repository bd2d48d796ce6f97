import type { Transaction } from 'sequelize';
import type { Database } from './connect';

/**
 * Where a repository works: the workshop comes from the session, so that no query can forget it,
 * and the transaction, where there is one, from the service.
 */
export interface Scope {
  database: Database;
  workshopId: string;
  transaction?: Transaction | undefined;
}
