import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inTransaction, mayBeRetried } from '~/server/database/transaction';
import { freshDatabase, type FreshDatabase } from '../../support/database';

let fresh: FreshDatabase;
beforeAll(async () => {
  fresh = await freshDatabase();
  const { sequelize } = fresh.database;
  await sequelize.query(
    'CREATE TABLE pots (id INT PRIMARY KEY, amount INT NOT NULL) ENGINE=InnoDB',
  );
  await sequelize.query('INSERT INTO pots VALUES (1, 0), (2, 0)');
});
afterAll(() => fresh.drop());

describe('inTransaction', () => {
  it('runs both of two that deadlock, the whole of each', async () => {
    const { database } = fresh;
    let runs = 0;
    let arrived = 0;
    const bothHoldOne = new Promise<void>((resolve) => {
      const look = setInterval(() => {
        if (arrived < 2) return;
        clearInterval(look);
        resolve();
      }, 5);
    });
    const move = (first: number, second: number) =>
      inTransaction(database, async (transaction) => {
        runs += 1;
        const raise = (id: number) =>
          database.sequelize.query('UPDATE pots SET amount = amount + 1 WHERE id = ?', {
            replacements: [id],
            transaction,
          });
        await raise(first);
        arrived += 1;
        await bothHoldOne;
        await raise(second);
      });
    await Promise.all([move(1, 2), move(2, 1)]);
    expect(await fresh.sql('SELECT amount FROM pots ORDER BY id')).toEqual([
      { amount: 2 },
      { amount: 2 },
    ]);
    // one of them was the victim and began again
    expect(runs).toBe(3);
  });

  it('gives up after five, and keeps nothing', async () => {
    let runs = 0;
    const victim = Object.assign(new Error('deadlock'), { parent: { errno: 1213 } });
    const failing = inTransaction(fresh.database, async (transaction) => {
      runs += 1;
      await fresh.database.sequelize.query('UPDATE pots SET amount = 99', { transaction });
      throw victim;
    });
    await expect(failing).rejects.toBe(victim);
    expect(runs).toBe(5);
    expect(await fresh.sql('SELECT amount FROM pots WHERE amount = 99')).toEqual([]);
  });

  it('does not run again what failed for another reason', async () => {
    let runs = 0;
    const failing = inTransaction(fresh.database, async () => {
      runs += 1;
      throw new Error('no');
    });
    await expect(failing).rejects.toThrow('no');
    expect(runs).toBe(1);
  });
});

describe('mayBeRetried', () => {
  it('knows deadlock, lock wait and serialisation failure wherever the driver put them', () => {
    expect(mayBeRetried({ errno: 1213 })).toBe(true);
    expect(mayBeRetried({ parent: { errno: 1205 } })).toBe(true);
    expect(mayBeRetried({ original: { sqlState: '40001' } })).toBe(true);
    expect(mayBeRetried({ parent: { errno: 1062, sqlState: '23000' } })).toBe(false);
    expect(mayBeRetried(null)).toBe(false);
    expect(mayBeRetried('1213')).toBe(false);
  });
});
