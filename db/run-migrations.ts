import { readdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { QueryTypes, type Sequelize } from 'sequelize';
import { Umzug, type UmzugStorage } from 'umzug';
import { guardIssued } from './issued-guards';

const folder = resolve('db/migrations');

/**
 * Brings the tables to what this version of the program needs: every file of db/migrations once,
 * in the order of their names, up only. Interrupted anywhere, it may be run again. Returns the
 * names it applied and, where a right is missing, a sentence about it.
 */
export async function runMigrations(
  sequelize: Sequelize,
): Promise<{ applied: string[]; warning: string | null }> {
  await sequelize.query(
    `CREATE TABLE IF NOT EXISTS applied_migrations (
      name VARCHAR(128) NOT NULL PRIMARY KEY,
      applied_at DATETIME(3) NOT NULL
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
  );
  const umzug = new Umzug({
    context: sequelize,
    storage: appliedMigrations(sequelize),
    logger: undefined,
    migrations: readdirSync(folder)
      .filter((file) => file.endsWith('.ts'))
      .sort()
      .map((file) => ({ name: file.slice(0, -'.ts'.length), path: resolve(folder, file) }))
      .map(({ name, path }) => ({
        name,
        up: async (params: { context: Sequelize }) => {
          const migration = (await import(path)) as Migration;
          await migration.up(params);
        },
      })),
  });
  const done = await umzug.up();
  return { applied: done.map(({ name }) => name), warning: await guardIssued(sequelize) };
}

interface Migration {
  up(params: { context: Sequelize }): Promise<void>;
}

/** Where umzug notes what it did. Its own table maker would not use utf8mb4. */
function appliedMigrations(sequelize: Sequelize): UmzugStorage<Sequelize> {
  return {
    async logMigration({ name }) {
      await sequelize.query('INSERT INTO applied_migrations (name, applied_at) VALUES (?, ?)', {
        replacements: [name, new Date()],
      });
    },
    async unlogMigration({ name }) {
      await sequelize.query('DELETE FROM applied_migrations WHERE name = ?', {
        replacements: [name],
      });
    },
    async executed() {
      const rows = await sequelize.query<{ name: string }>(
        'SELECT name FROM applied_migrations ORDER BY name',
        { type: QueryTypes.SELECT },
      );
      return rows.map(({ name }) => name);
    },
  };
}
