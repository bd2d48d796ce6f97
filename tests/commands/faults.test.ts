import { createServer, type AddressInfo } from 'node:net';
import { describe, expect, it } from 'vitest';
import { aptFault } from '../../db/local/debian-packages.mjs';
import { daemonFault } from '../../db/local/daemon.mjs';
import { StartFault } from '../../db/local/start-fault.mjs';
import { explainFault } from '../../src/commands/steps/explain-fault.mjs';
import { npmFault } from '../../src/commands/steps/install-packages.mjs';
import { requireNode } from '../../src/commands/steps/node-version.mjs';
import { requireWebPort } from '../../src/commands/steps/require-web-port.mjs';

/** One sentence of what is wrong and one of what to do, as a person would want them. */
function expectSentences(fault: { message: string; nextStep: string }, says: RegExp) {
  expect(fault.message).toMatch(says);
  for (const text of [fault.message, fault.nextStep]) {
    expect(text).toMatch(/^[A-Z][^\n]*\S$/);
    expect(text).not.toMatch(/ {4}at |node:internal/);
  }
}

describe('a failed npm ci', () => {
  it.each([
    ['npm error code ENOTFOUND\nnpm error errno ENOTFOUND', /registry cannot be reached/],
    ['npm error code ECONNREFUSED', /registry cannot be reached/],
    [
      'npm error code ENOSPC\nnpm error nospc ENOSPC: no space left on device, write',
      /disk is full/,
    ],
    ['npm error code EACCES\nnpm error syscall mkdir', /lacks the right/],
    [
      'npm error `npm ci` can only install packages when your package.json and lock are in sync',
      /in sync/,
    ],
  ])('%j', (output, says) => expectSentences(npmFault(output), says));
});

describe('a failed apt-get', () => {
  it.each([
    [
      "E: Failed to fetch http://deb.debian.org/x  Could not resolve 'deb.debian.org'",
      /archive cannot be reached/,
    ],
    ["E: You don't have enough free space in /var/cache/apt/archives/.", /disk is full/],
    ['E: Unable to locate package mariadb-server', /Unable to locate package/],
  ])('%j', (output, says) => expectSentences(aptFault(output, 'mariadb-server'), says));
});

describe('a MariaDB that does not start', () => {
  it.each([
    [
      '[ERROR] InnoDB: Operating system error number 28; [ERROR] preallocating: No space left on device',
      /is full/,
    ],
    [
      "[ERROR] Can't start server: Bind on TCP/IP port. Got error: 98: Address already in use",
      /port chosen .* taken/,
    ],
    ['[ERROR] InnoDB: Unable to lock ./ibdata1 error: 11', /Another MariaDB/],
    [
      '[ERROR] mariadbd: Can\'t create/write to file (Errcode: 13 "Permission denied")',
      /lacks the right/,
    ],
    ['2026-01-01 [ERROR] InnoDB: Header page is damaged', /Header page is damaged/],
    ['', /^MariaDB did not start\.$/],
  ])('%j', (log, says) => expectSentences(daemonFault(log, '/some/folder'), says));
});

describe('anything else', () => {
  it.each([
    [
      Object.assign(new Error('ENOSPC: no space left on device, write'), { code: 'ENOSPC' }),
      /disk is full/,
    ],
    [
      Object.assign(new Error('x'), { code: 'EACCES', path: '/srv/dist' }),
      /lacks a right .*\/srv\/dist/,
    ],
    [Object.assign(new Error('x'), { code: 'EROFS' }), /only be read/],
    [new Error('odd'), /unforeseen .*odd/],
    [new StartFault('Own sentence.', 'Own step.'), /^Own sentence\.$/],
  ])('%s', (error, says) => {
    const { sentence, nextStep } = explainFault(error);
    expectSentences({ message: sentence, nextStep }, says);
  });
});

describe('Node', () => {
  it.each(['20.11.0', '20.20.2'])('%s is taken', (version) =>
    expect(() => requireNode(version)).not.toThrow(),
  );
  it.each(['18.20.0', '20.10.9', '22.12.0'])('%s is refused by name', (version) =>
    expect(() => requireNode(version)).toThrow(`this is Node ${version}`),
  );
});

describe('the web port', () => {
  it('that is taken is named, with another to try', async () => {
    const other = createServer();
    await new Promise<void>((resolve) => other.listen(0, '127.0.0.1', resolve));
    const { port } = other.address() as AddressInfo;
    const fault = (await requireWebPort({ host: '127.0.0.1', port }, 'npm start', 0).catch(
      (error: unknown) => error,
    )) as StartFault;
    expectSentences(fault, new RegExp(`Port ${port} of 127.0.0.1 is taken`));
    expect(fault.nextStep).toContain(`DIPWRIGHT_PORT=${port + 1} npm start`);
    await new Promise((resolve) => other.close(resolve));
    await expect(
      requireWebPort({ host: '127.0.0.1', port }, 'npm start', 0),
    ).resolves.toBeUndefined();
  });

  it('that is none, or on an address that is not ours, is refused', async () => {
    await expect(
      requireWebPort({ host: '127.0.0.1', port: Number('x') }, 'npm start', 0),
    ).rejects.toThrow(/not a port/);
    await expect(
      requireWebPort({ host: '203.0.113.7', port: 4321 }, 'npm start', 0),
    ).rejects.toThrow(/no address 203/);
  });
});
