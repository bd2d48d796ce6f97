import { execFileSync } from 'node:child_process';
import {
  chmodSync,
  chownSync,
  cpSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  rmSync,
  statSync,
} from 'node:fs';
import { createServer, connect } from 'node:net';
import { networkInterfaces, tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import mariadb from 'mariadb';
import { afterAll, afterEach, expect, it } from 'vitest';
import { openLocalServer } from '../../db/local-server.mjs';

/** The account without rights of every Linux. */
const nobody = 65_534;

const folder = mkdtempSync(join(tmpdir(), 'dw-'));
chmodSync(folder, 0o755);
const opened: Awaited<ReturnType<typeof openLocalServer>>[] = [];
const said: string[] = [];

afterEach(async () => {
  for (const server of opened.splice(0)) await server.stop();
  said.length = 0;
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** All tests but two use one data folder, one after the other. */
async function open(checkout = folder) {
  const server = await openLocalServer({
    checkout,
    name: 'demo',
    database: 'dipwright',
    say: (line) => said.push(line),
  });
  opened.push(server);
  return server;
}

type Place = { host: string; port: number; user: string; password: string; database?: string };

async function query<T = unknown>(
  { host, port, user, password, database }: Place,
  sql: string,
): Promise<T> {
  const connection = await mariadb.createConnection({
    host,
    port,
    user,
    password,
    ...(database ? { database } : {}),
  });
  try {
    return (await connection.query(sql)) as T;
  } finally {
    await connection.end();
  }
}

it('makes a server of its own, for loopback and its own database only', async () => {
  const server = await open();
  await query(server, 'CREATE TABLE made (id INT PRIMARY KEY)');
  await expect(query(server, 'CREATE DATABASE another')).rejects.toThrow(/denied/);
  await expect(query(server, 'SELECT * FROM mysql.global_priv')).rejects.toThrow(/denied/);
  await expect(query({ ...server, password: 'wrong' }, 'DO 0')).rejects.toThrow(/denied/);
  expect(
    await query(
      server,
      'SELECT @@bind_address AS bound, @@log_bin AS log, @@innodb_flush_log_at_trx_commit AS flush',
    ),
  ).toMatchObject([{ bound: '127.0.0.1', log: 0n, flush: 1n }]);
  const outward = Object.values(networkInterfaces())
    .flat()
    .find((address) => address?.family === 'IPv4' && !address.internal);
  if (outward) expect(await answersOn(outward.address, server.port)).toBe(false);
});

it('never runs as root and keeps its password from others', async () => {
  const server = await open();
  expect(readFileSync(`/proc/${server.pid}/status`, 'utf8')).not.toMatch(/^Uid:\s+0\b/m);
  expect(readFileSync(`/proc/${server.pid}/cmdline`, 'utf8')).not.toContain(server.password);
  expect(statSync(join(server.folder, 'credentials.json')).mode & 0o777).toBe(0o600);
  expect(server.password.length).toBeGreaterThanOrEqual(32);
});

it('keeps everything through kill -9 and a new start, on the same port', async () => {
  const first = await open();
  await query(first, 'CREATE TABLE kept (id INT PRIMARY KEY) ENGINE=InnoDB');
  await query(first, 'INSERT INTO kept VALUES (1), (2), (3)');
  process.kill(first.pid, 'SIGKILL');
  const second = await open();
  expect(second.pid).not.toBe(first.pid);
  expect(second.port).toBe(first.port);
  expect(second.password).toBe(first.password);
  expect(await query(second, 'SELECT id FROM kept ORDER BY id')).toMatchObject([
    { id: 1 },
    { id: 2 },
    { id: 3 },
  ]);
});

it('notices that its server was killed and starts it again', async () => {
  const server = await open();
  process.kill(server.pid, 'SIGKILL');
  await expect.poll(() => server.lives()).toBe(false);
  await server.restart();
  expect(server.lives()).toBe(true);
  await query(server, 'DO 0');
});

it('uses the server that runs already, and takes its rights as they should be', async () => {
  const first = await open();
  const second = await open();
  expect(second.pid).toBe(first.pid);
  expect(said.at(-1)).toMatch(/already runs/);
});

it('takes another port when its own is taken by somebody else', async () => {
  const first = await open();
  const { port } = first;
  await first.stop();
  const intruder = createServer();
  await new Promise<void>((resolve) => intruder.listen(port, '127.0.0.1', resolve));
  const second = await open();
  expect(second.port).not.toBe(port);
  await query(second, 'DO 0');
  await new Promise((resolve) => intruder.close(resolve));
});

// As a plain account MariaDB runs under that account itself and reaches whatever the checkout is in.
it.runIf(process.getuid?.() === 0)(
  'goes outside the checkout when the database account cannot reach into it',
  async () => {
    const closed = join(folder, 'closed');
    const clone = join(closed, 'clone');
    mkdirSync(clone, { recursive: true });
    chmodSync(closed, 0o700);
    const server = await open(clone);
    expect(server.folder.startsWith('/var/lib/dipwright-')).toBe(true);
    await query(server, 'DO 0');
    await server.stop();
    opened.pop();
    rmSync(join(server.folder, '..'), { recursive: true });
  },
);

// As root we can become somebody else; as somebody else every other test here is this test.
it.runIf(process.getuid?.() === 0 && openToAll(process.execPath))(
  'works for a plain account, which then runs it itself',
  () => {
    const home = join(folder, 'plain');
    mkdirSync(home);
    chownSync(home, nobody, nobody);
    cpSync(resolve('db'), join(folder, 'db'), { recursive: true });
    const script = `
    import { openLocalServer } from ${JSON.stringify(join(folder, 'db/local-server.mjs'))};
    const server = await openLocalServer({ checkout: ${JSON.stringify(home)}, name: 'demo', database: 'dipwright', say: () => {} });
    const { readFileSync } = await import('node:fs');
    console.log(/^Uid:.*/m.exec(readFileSync('/proc/' + server.pid + '/status', 'utf8'))[0]);
    await server.stop();
    console.log(server.lives());`;
    const said = execFileSync(process.execPath, ['--input-type=module', '-e', script], {
      uid: nobody,
      gid: nobody,
      cwd: home,
      encoding: 'utf8',
    });
    expect(said).toBe(`Uid:\t${nobody}\t${nobody}\t${nobody}\t${nobody}\nfalse\n`);
  },
);

it('says in a sentence why a server does not start', async () => {
  const server = await open();
  await server.stop();
  execFileSync('truncate', ['--size=100', join(server.folder, 'server/data/ibdata1')]);
  const fault = await open().catch((error: Error & { nextStep?: string }) => error);
  expect(fault).toMatchObject({
    name: 'StartFault',
    message: expect.stringMatching(/^MariaDB did not start \(.+\)\.$/),
  });
  expect(fault).toMatchObject({ nextStep: expect.stringContaining('err.log') });
});

function answersOn(host: string, port: number): Promise<boolean> {
  return new Promise((resolve) => {
    const socket = connect({ host, port, timeout: 2_000 });
    const end = (answer: boolean) => {
      socket.destroy();
      resolve(answer);
    };
    socket
      .once('connect', () => end(true))
      .once('error', () => end(false))
      .once('timeout', () => end(false));
  });
}

/** May every account walk down to this file? */
function openToAll(file: string): boolean {
  for (let at = file; at !== '/'; at = dirname(at)) {
    if ((statSync(at).mode & 0o001) === 0) return false;
  }
  return true;
}
