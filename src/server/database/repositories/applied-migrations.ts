import { QueryTypes } from 'sequelize';
import type { Database } from '../connect';

/** Names of the migrations that this database has had. Throws when it does not answer. */
export async function appliedMigrations(database: Database): Promise<string[]> {
  const rows = await database.sequelize.query<{ name: string }>(
    'SELECT name FROM applied_migrations',
    { type: QueryTypes.SELECT },
  );
  return rows.map(({ name }) => name);
}
