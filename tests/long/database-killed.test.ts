import { setTimeout as delay } from 'node:timers/promises';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { openProduct } from '../support/product';

const clients = 20;
const readingsOfEach = 50;
const kills = 3;

let product: Awaited<ReturnType<typeof openProduct>>;
beforeAll(async () => {
  product = await openProduct();
});
afterAll(() => product.close());

it(`keeps ${clients * readingsOfEach} keyed readings through ${kills} kill -9 of the database: acknowledged = stored, none twice`, async () => {
  const cookie = await product.signIn('manager@tarnside.example');
  const headers = { Cookie: cookie, Origin: product.origin, 'Content-Type': 'application/json' };
  const tanks = (await (await fetch(`${product.origin}/api/v1/tanks`, { headers })).json()) as {
    id: string;
    name: string;
  }[];
  const tank = tanks.find(({ name }) => name === 'Drinking water cistern')!;
  const before = await product.sql<{ id: string }>('SELECT id FROM readings');

  const acknowledged = new Map<string, string>();
  const statuses = new Map<number, number>();
  let repeats = 0;

  /** Sends one reading with one key until the server says that it has it. */
  async function keep(key: string, depthMm: number): Promise<void> {
    for (let attempt = 0; ; attempt += 1) {
      if (attempt === 200) throw new Error(`reading ${key} was never acknowledged`);
      if (attempt > 0) repeats += 1;
      const answer = await fetch(`${product.origin}/api/v1/tanks/${tank.id}/readings`, {
        method: 'POST',
        headers: { ...headers, 'Idempotency-Key': key },
        body: JSON.stringify({ at: '2026-11-30T08:15:00Z', depthMm }),
      });
      statuses.set(answer.status, (statuses.get(answer.status) ?? 0) + 1);
      const body = (await answer.json()) as { id: string };
      if (answer.status === 201) return void acknowledged.set(key, body.id);
      expect(answer.status, JSON.stringify(body)).toBe(503);
      await delay(50);
    }
  }

  const work = Array.from({ length: clients }, async (_, client) => {
    for (let n = 0; n < readingsOfEach; n += 1)
      await keep(`kill-${client}-${n}`, (client * readingsOfEach + n) % 300);
  });
  let killed = 0;
  const killer = (async () => {
    while (killed < kills) {
      const aim = ((killed + 1) * clients * readingsOfEach) / (kills + 1);
      while (acknowledged.size < aim) await delay(5);
      process.kill(product.database.pid, 'SIGKILL');
      killed += 1;
      while (product.database.lives()) await delay(5);
      await product.database.restart();
    }
  })();
  await Promise.all([...work, killer]);

  const stored = await product.sql<{ id: string; idempotency_key: string }>(
    'SELECT id, idempotency_key FROM readings',
  );
  const fresh = stored.filter(({ id }) => !before.some((old) => old.id === id));
  console.log(
    `${acknowledged.size} acknowledged, ${fresh.length} stored, ${killed} kills, ${repeats} sent again, answers: ${JSON.stringify([...statuses])}`,
  );
  expect(killed).toBe(kills);
  expect(acknowledged.size).toBe(clients * readingsOfEach);
  expect(fresh.length).toBe(acknowledged.size);
  expect(new Map(fresh.map((row) => [row.idempotency_key, row.id]))).toEqual(acknowledged);
});
