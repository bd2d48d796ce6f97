import { afterEach, expect, it } from 'vitest';
import type { Context } from '~/server/context';
import { checkReadiness } from '~/server/services/check-readiness';
import { freshDatabase, type FreshDatabase } from '../../support/database';

let fresh: FreshDatabase | undefined;
afterEach(async () => {
  await fresh?.drop();
  fresh = undefined;
});

const ask = async (database: FreshDatabase['database']) => {
  const { ready, checks } = await checkReadiness({ database } as Context);
  return { ready, fit: Object.fromEntries(checks.map(({ name, fit }) => [name, fit])), checks };
};

it('is ready on a migrated database', async () => {
  fresh = await freshDatabase();
  expect(await ask(fresh.database)).toMatchObject({
    ready: true,
    fit: { database: true, migrations: true, disk: true },
  });
});

it('says of a database that was never migrated that migrations are missing, not that it is away', async () => {
  fresh = await freshDatabase({ migrate: false });
  const { ready, fit, checks } = await ask(fresh.database);
  expect({ ready, fit }).toEqual({
    ready: false,
    fit: { database: true, migrations: false, disk: true },
  });
  expect(checks[1]?.detail).toMatch(/^Not applied: 0001-/);
});
