import { chmodSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import mariadb from 'mariadb';
import { anyFreePort } from '../../db/local/free-port.mjs';
import { openLocalServer } from '../../db/local-server.mjs';
import { localSettings } from '../../src/commands/steps/local-settings.mjs';
import { prepareData } from '../../src/commands/steps/prepare-data.mjs';
import { startWebServer } from '../../src/commands/steps/web-server.mjs';

const checkout = resolve(import.meta.dirname, '../..');

/** A MariaDB, a seeded database and the built product that only one test file knows: to be killed. */
export async function openProduct() {
  const build = process.env.DIPWRIGHT_TEST_BUILD;
  if (!build)
    throw new Error('No build: run `node src/commands/test.mjs --only long`, which makes one.');
  const folder = mkdtempSync(join(tmpdir(), 'dw-'));
  chmodSync(folder, 0o755);
  const say = () => undefined;
  const database = await openLocalServer({
    checkout: folder,
    name: 'test',
    database: 'dipwright',
    say,
  });
  const port = await anyFreePort();
  const settings = {
    ...localSettings(database),
    DIPWRIGHT_MODE: 'test',
    DIPWRIGHT_HOST: '127.0.0.1',
    DIPWRIGHT_PORT: String(port),
    DIPWRIGHT_ORIGIN: `http://127.0.0.1:${port}`,
  };
  await prepareData(checkout, settings);
  const origin = settings.DIPWRIGHT_ORIGIN;
  let web = await startWebServer(checkout, build, settings, { quiet: true });

  return {
    origin,
    database,
    get webPid() {
      return web.pid as number;
    },
    /** Waits until the killed web server is gone, then starts another. */
    async restartWeb() {
      await web.ended;
      web = await startWebServer(checkout, build, settings, { quiet: true });
    },
    webEnded: () => web.ended as Promise<{ code: number | null; signal: string | null }>,
    async signIn(email: string): Promise<string> {
      const answer = await fetch(`${origin}/api/v1/session`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify({ email, password: 'true-litres-2026' }),
      });
      if (answer.status !== 204) throw new Error(`sign-in answered ${answer.status}`);
      return (answer.headers.get('set-cookie') ?? '').split(';')[0] ?? '';
    },
    async sql<Row>(statement: string): Promise<Row[]> {
      const { host, port: databasePort, user, password } = database;
      const connection = await mariadb.createConnection({
        host,
        port: databasePort,
        user,
        password,
        database: 'dipwright',
        bigIntAsNumber: true,
      });
      try {
        return (await connection.query(statement)) as Row[];
      } finally {
        await connection.end();
      }
    },
    async close() {
      await web.stop();
      await database.stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
