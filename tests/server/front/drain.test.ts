import { Agent, request as httpRequest } from 'node:http';
import { afterEach, expect, it } from 'vitest';
import { drain } from '~/server/front/drain';
import { openFrontServer } from '../../support/front-server';

let opened: Awaited<ReturnType<typeof openFrontServer>> | undefined;
afterEach(async () => {
  await opened?.close().catch(() => undefined);
});

it('says "leaving" on /readyz while it still takes requests, then closes', async () => {
  opened = await openFrontServer(
    async (_request, response) =>
      void response.writeHead(200, { 'content-type': 'text/plain' }).end('ready'),
  );
  expect((await opened.ask('/readyz')).status).toBe(200);
  const left = drain(opened.server, opened.state, { leaveSeconds: 0.5, drainSeconds: 5 });
  const asked = await opened.ask('/readyz');
  expect(asked.status).toBe(503);
  expect(asked.headers.connection).toBe('close');
  expect((await opened.ask('/healthz')).status).toBe(200);
  expect((await opened.ask('/page')).status).toBe(200);
  await left;
  await expect(opened.ask('/page')).rejects.toThrow(/ECONNREFUSED/);
});

it('lets a request under way finish, and does not wait for idle connections', async () => {
  let release = () => {};
  let entered = () => {};
  const inside = new Promise<void>((resolve) => (entered = resolve));
  const gate = new Promise<void>((resolve) => (release = resolve));
  opened = await openFrontServer(async (request, response) => {
    if (request.url === '/slow') {
      entered();
      await gate;
    }
    response.writeHead(200, { 'content-type': 'text/plain' });
    response.end('whole answer');
  });
  const idle = new Agent({ keepAlive: true });
  await new Promise<void>((resolve) => {
    httpRequest(
      {
        port: opened!.port,
        host: '127.0.0.1',
        path: '/',
        agent: idle,
        headers: { Host: 'tarnside.example' },
      },
      (response) => {
        response.resume();
        response.on('end', resolve);
      },
    ).end();
  });
  const slow = opened.ask('/slow');
  await inside;
  const startedAt = performance.now();
  const left = drain(opened.server, opened.state, { leaveSeconds: 0, drainSeconds: 20 });
  release();
  expect((await slow).body.toString()).toBe('whole answer');
  await left;
  expect(performance.now() - startedAt).toBeLessThan(5_000);
  idle.destroy();
});

it('cuts what does not finish in time', async () => {
  let entered = () => {};
  const inside = new Promise<void>((resolve) => (entered = resolve));
  opened = await openFrontServer(() => {
    entered();
    return new Promise(() => undefined);
  });
  const stuck = opened.ask('/stuck').catch((error: NodeJS.ErrnoException) => error.code);
  await inside;
  await drain(opened.server, opened.state, { leaveSeconds: 0, drainSeconds: 0.2 });
  expect(await stuck).toBe('ECONNRESET');
});
