import { afterEach, describe, expect, it } from 'vitest';
import { guardIssued } from '../../db/issued-guards';
import { runMigrations } from '../../db/run-migrations';
import { freshDatabase, type FreshDatabase } from '../support/database';

let fresh: FreshDatabase | undefined;
afterEach(async () => {
  await fresh?.drop();
  fresh = undefined;
});

describe('migrations', () => {
  it('make every table InnoDB, utf8mb4 and with a primary key, and never count on auto-increment', async () => {
    fresh = await freshDatabase();
    const tables = await fresh.sql<{
      name: string;
      engine: string;
      collation: string;
      auto: number | null;
    }>(
      `SELECT table_name AS name, engine, table_collation AS collation, auto_increment AS auto
       FROM information_schema.tables WHERE table_schema = DATABASE()`,
    );
    expect(tables.length).toBeGreaterThanOrEqual(14);
    for (const { name, engine, collation, auto } of tables) {
      expect(engine, name).toBe('InnoDB');
      expect(collation, name).toMatch(/^utf8mb4_/);
      expect(auto, name).toBeNull();
    }
    const keyed = await fresh.sql<{ name: string }>(
      `SELECT DISTINCT table_name AS name FROM information_schema.table_constraints
       WHERE table_schema = DATABASE() AND constraint_type = 'PRIMARY KEY'`,
    );
    expect(keyed.map(({ name }) => name).sort()).toEqual(tables.map(({ name }) => name).sort());
  });

  it('run once, and again without harm', async () => {
    fresh = await freshDatabase({ migrate: false });
    const first = await runMigrations(fresh.database.sequelize);
    expect(first.applied).toContain('0001-first-tables');
    expect(first.warning).toBeNull();
    const again = await runMigrations(fresh.database.sequelize);
    expect(again).toEqual({ applied: [], warning: null });
  });

  it('go on where they were broken off', async () => {
    fresh = await freshDatabase();
    const { sequelize } = fresh.database;
    // as if the first had died before it was noted, with its last tables not made yet
    for (const table of ['applied_seeds', 'readings', 'handovers'])
      await sequelize.query(`DROP TABLE ${table}`);
    await sequelize.query("DELETE FROM applied_migrations WHERE name = '0001-first-tables'");
    expect((await runMigrations(sequelize)).applied).toEqual(['0001-first-tables']);
    expect(await fresh.sql('SELECT * FROM readings')).toEqual([]);
  });
});

describe('0003, closer rows', () => {
  it('lets stand what was issued before, guards and all, and may run again', async () => {
    fresh = await freshDatabase();
    const { sequelize } = fresh.database;
    // the tables as they were before it, with a row that was issued then
    await sequelize.query('ALTER TABLE strapping_rows DROP COLUMN between_rows');
    await sequelize.query('ALTER TABLE revisions DROP COLUMN brim_plus_minus_l');
    await sequelize.query('ALTER TABLE tanks DROP COLUMN own_size_plus_minus');
    await sequelize.query("DELETE FROM applied_migrations WHERE name = '0003-between-rows'");
    await sequelize.query('SET FOREIGN_KEY_CHECKS = 0');
    await sequelize.query(
      "INSERT INTO strapping_rows VALUES ('00000000-0000-4000-8000-000000000001', 0, 10, 5, 5000, 1)",
    );
    await sequelize.query('SET FOREIGN_KEY_CHECKS = 1');
    expect((await runMigrations(sequelize)).applied).toEqual(['0003-between-rows']);
    // broken off before it was noted: everything is there already
    await sequelize.query("DELETE FROM applied_migrations WHERE name = '0003-between-rows'");
    expect((await runMigrations(sequelize)).applied).toEqual(['0003-between-rows']);
    expect(await fresh.sql('SELECT depth_mm, volume_l, between_rows FROM strapping_rows')).toEqual([
      { depth_mm: 10, volume_l: 5, between_rows: 0 },
    ]);
  });
});

describe('the guards of what was issued', () => {
  it('say so where the right to make triggers is missing', async () => {
    for (const errno of [1142, 1044, 1419]) {
      const refusing = {
        query: () => Promise.reject(Object.assign(new Error('no'), { parent: { errno } })),
      };
      expect(await guardIssued(refusing as never)).toContain('Grant TRIGGER');
    }
    const failing = {
      query: () => Promise.reject(Object.assign(new Error('gone'), { parent: { errno: 2006 } })),
    };
    await expect(guardIssued(failing as never)).rejects.toThrow('gone');
  });
});
