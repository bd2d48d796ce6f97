import { setTimeout as delay } from 'node:timers/promises';
import mariadb, { type Connection } from 'mariadb';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { administrator } from '../../db/local/administrator.mjs';
import { openProduct } from '../support/product';

/** Share of the rows that are written when the web server is killed; 0: while the table is computed. */
const shares = [0, 0.02, 0.1, 0.2, 0.35, 0.5, 0.65, 0.8, 0.95, 1];

let product: Awaited<ReturnType<typeof openProduct>>;
let root: Connection;
beforeAll(async () => {
  product = await openProduct();
  // The application's account may not see what other connections have under way.
  root = await mariadb.createConnection({
    socketPath: product.database.socket,
    user: administrator(),
    bigIntAsNumber: true,
  });
});
afterAll(async () => {
  await root.end();
  await product.close();
});

it(`never leaves half a table when the web server is killed at ${shares.length} points of an issue`, async () => {
  const cookie = await product.signIn('designer@tarnside.example');
  const headers = { Cookie: cookie, Origin: product.origin, 'Content-Type': 'application/json' };
  const tanks = (await (await fetch(`${product.origin}/api/v1/tanks`, { headers })).json()) as {
    id: string;
    name: string;
  }[];
  const tank = tanks.find(({ name }) => name === 'Heating oil')!;
  const issue = (stepMm: number) =>
    fetch(`${product.origin}/api/v1/tanks/${tank.id}/revisions`, {
      method: 'POST',
      headers,
      body: JSON.stringify({ stepMm }),
    });

  const counted = await rowsWritten();
  expect((await issue(0.5)).status).toBe(201);
  const rows = (await rowsWritten()) - counted;
  const standing = await revisionCount();

  const story: string[] = [];
  let midway = 0;
  for (const [point, share] of shares.entries()) {
    const from = await rowsWritten();
    let answered = false;
    const answer = issue(0.5 + (point + 1) / 10_000)
      .then(
        ({ status }) => String(status),
        () => 'no answer',
      )
      .finally(() => (answered = true));
    let written = 0;
    if (share === 0) await delay(300);
    else while (!answered && (written = (await rowsWritten()) - from) < rows * share);
    process.kill(product.webPid, 'SIGKILL');
    if (written > 0 && written < rows) midway += 1;
    story.push(`${written} of ${rows} rows: ${await answer}`);
    await product.restartWeb();
    // The killed server's transaction is rolled back once the database notices that it is gone.
    await expect.poll(openTransactions, { timeout: 20_000 }).toBe(0);
  }

  const revisions = await product.sql<{ letter: string; wanted: number; stored: number }>(
    `SELECT r.letter, r.row_count AS wanted, COUNT(s.row_no) AS stored
       FROM revisions r LEFT JOIN strapping_rows s ON s.revision_id = r.id GROUP BY r.id`,
  );
  const orphans = await product.sql(
    'SELECT s.revision_id FROM strapping_rows s LEFT JOIN revisions r ON r.id = s.revision_id WHERE r.id IS NULL',
  );
  console.log(
    `${story.join('; ')}; ${revisions.length - standing} of ${shares.length} stand, whole`,
  );
  for (const { letter, wanted, stored } of revisions)
    expect(stored, `rows of revision ${letter}`).toBe(wanted);
  expect(orphans).toEqual([]);
  expect(midway, 'kills while rows were being written').toBeGreaterThan(0);

  // What stands is read back with its hash checked, and the next issue works as ever.
  const list = (await (
    await fetch(`${product.origin}/api/v1/tanks/${tank.id}/revisions`, { headers })
  ).json()) as { id: string }[];
  for (const { id } of list) {
    expect(
      (await fetch(`${product.origin}/api/v1/revisions/${id}/table`, { headers })).status,
    ).toBe(200);
  }
  expect((await issue(7)).status).toBe(201);
});

async function rowsWritten(): Promise<number> {
  const [row] = (await root.query("SHOW GLOBAL STATUS LIKE 'Handler_write'")) as {
    Value: string;
  }[];
  if (row === undefined) throw new Error('The server does not count written rows.');
  return Number(row.Value);
}

async function openTransactions(): Promise<number> {
  const [row] = (await root.query(
    'SELECT COUNT(*) AS open FROM information_schema.innodb_trx',
  )) as { open: number }[];
  return row?.open ?? 0;
}

async function revisionCount(): Promise<number> {
  const [row] = await product.sql<{ n: number }>('SELECT COUNT(*) AS n FROM revisions');
  return row?.n ?? 0;
}
