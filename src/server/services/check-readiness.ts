import { readdir, statfs } from 'node:fs/promises';
import { resolve } from 'node:path';
import type { Context } from '../context';
import { appliedMigrations } from '../database/repositories/applied-migrations';

export interface Check {
  name: 'database' | 'migrations' | 'disk';
  fit: boolean;
  detail: string;
}

/** A table of 20 000 rows takes about 2 MB; this leaves room to notice and act. */
const leastFreeMb = 256;

/** Whether this process can do its work just now, and if not, why. No secret and no path is told. */
export async function checkReadiness(
  context: Context,
): Promise<{ ready: boolean; checks: Check[] }> {
  const applied = await appliedMigrations(context.database).catch((error: unknown) =>
    // a database that answers, but was never migrated
    isMissingTable(error) ? [] : null,
  );
  const checks: Check[] = [
    {
      name: 'database',
      fit: applied !== null,
      detail: applied === null ? 'The database does not answer.' : 'The database answers.',
    },
    await migrationsCheck(applied ?? []),
    await diskCheck(),
  ];
  return { ready: checks.every(({ fit }) => fit), checks };
}

/** ER_NO_SUCH_TABLE. */
function isMissingTable(error: unknown): boolean {
  const cause = (error as { original?: { errno?: unknown } } | null)?.original;
  return cause?.errno === 1146;
}

async function migrationsCheck(applied: readonly string[]): Promise<Check> {
  const files = await readdir(resolve('db/migrations')).catch(() => []);
  const wanted = files.filter((name) => name.endsWith('.ts')).map((name) => name.slice(0, -3));
  const missing = wanted.filter((name) => !applied.includes(name));
  const fit = wanted.length > 0 && missing.length === 0;
  const detail = fit
    ? 'All migrations are applied.'
    : wanted.length === 0
      ? 'The folder db/migrations is not there: start in the folder of the project.'
      : `Not applied: ${missing.join(', ')}.`;
  return { name: 'migrations', fit, detail };
}

async function diskCheck(): Promise<Check> {
  const { bavail, bsize } = await statfs('.');
  const freeMb = Math.floor((bavail * bsize) / 1e6);
  const fit = freeMb >= leastFreeMb;
  const detail = fit
    ? 'There is room on the disk.'
    : `Only ${freeMb} MB are free: ${leastFreeMb} MB are needed.`;
  return { name: 'disk', fit, detail };
}
