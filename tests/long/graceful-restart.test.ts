import { request as httpRequest } from 'node:http';
import { setTimeout as delay } from 'node:timers/promises';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { openProduct } from '../support/product';

let product: Awaited<ReturnType<typeof openProduct>>;
beforeAll(async () => {
  product = await openProduct();
});
afterAll(() => product.close());

const design = {
  format: 'dipwright-tank',
  version: 1,
  name: 'Barrel',
  solids: [{ id: 'barrel', role: 'holds', kind: 'cylinder', diameter: 1200, length: 2000 }],
};

it('answers every request that was under way at SIGTERM, then ends with 0', async () => {
  const body = JSON.stringify({ design, stepMm: 0.2 });
  const answers = Array.from({ length: 24 }, () => compute(body));
  await Promise.race(answers.map(({ sent }) => sent));
  await Promise.all(answers.map(({ sent }) => sent));
  // All are sent; the first are being computed and the rest wait for a thread.
  await delay(100);
  process.kill(product.webPid, 'SIGTERM');
  const rows = await Promise.all(answers.map(({ answer }) => answer));
  expect(rows).toEqual(answers.map(() => 6001));
  expect(await product.webEnded()).toEqual({ code: 0, signal: null });
  await product.restartWeb();
  expect((await fetch(`${product.origin}/readyz`)).status).toBe(200);
});

function compute(body: string): { sent: Promise<void>; answer: Promise<number> } {
  let markSent = () => {};
  const sent = new Promise<void>((resolve) => (markSent = resolve));
  const answer = new Promise<number>((resolve, reject) => {
    const request = httpRequest(
      `${product.origin}/api/v1/compute`,
      {
        method: 'POST',
        agent: false,
        headers: { 'Content-Type': 'application/json', 'Content-Length': Buffer.byteLength(body) },
      },
      (response) => {
        const parts: Buffer[] = [];
        response.on('data', (part: Buffer) => parts.push(part));
        response.on('error', reject);
        response.on('end', () => {
          const table = JSON.parse(Buffer.concat(parts).toString()) as { rows?: unknown[] };
          resolve(table.rows?.length ?? response.statusCode ?? 0);
        });
      },
    );
    request.on('error', reject);
    request.end(body, markSent);
  });
  return { sent, answer };
}
