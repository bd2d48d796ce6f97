import { spawn, spawnSync } from 'node:child_process';
import {
  chownSync,
  existsSync,
  mkdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
} from 'node:fs';
import { join } from 'node:path';
import { setTimeout as delay } from 'node:timers/promises';
import { administrator } from './administrator.mjs';
import { findProgram } from './debian-packages.mjs';
import { processIdentity } from './process-identity.mjs';
import { StartFault } from './start-fault.mjs';

/** @typedef {ReturnType<typeof import('./daemon-account.mjs').daemonAccount>} Account */

/** Where things stand below a data folder. Everything in `server/` belongs to MariaDB's account. */
export function daemonPaths(folder) {
  const server = join(folder, 'server');
  return {
    server,
    data: join(server, 'data'),
    tmp: join(server, 'tmp'),
    socket: join(server, 's.sock'),
    pid: join(server, 'm.pid'),
    log: join(server, 'err.log'),
  };
}

/**
 * Makes the system tables of a new data folder: beside its place first, then moved there whole, so
 * that a command stopped in the middle leaves nothing that looks finished.
 * @param {string} folder
 * @param {Account} account
 * @returns {boolean} false when they were there already
 */
export function makeSystemTables(folder, account) {
  const { server } = daemonPaths(folder);
  if (existsSync(server)) return false;
  const making = `${server}.making`;
  rmSync(making, { recursive: true, force: true });
  for (const made of [making, join(making, 'data'), join(making, 'tmp')]) {
    mkdirSync(made, { mode: 0o750 });
    if (account.asRoot) chownSync(made, account.uid, account.gid);
  }
  const made = spawnSync(
    findProgram('mariadb-install-db'),
    [
      '--no-defaults',
      ...(account.asRoot ? ['--user=mysql'] : []),
      `--datadir=${join(making, 'data')}`,
      '--auth-root-authentication-method=socket',
      `--auth-root-socket-user=${administrator()}`,
      '--skip-test-db',
    ],
    { encoding: 'utf8' },
  );
  if (made.status !== 0) throw daemonFault(`${made.stdout}\n${made.stderr}`, folder);
  renameSync(making, server);
  return true;
}

/** Number of the mariadbd that serves this folder, or null. */
export function runningDaemon(folder) {
  const paths = daemonPaths(folder);
  let pid;
  try {
    pid = Number(readFileSync(paths.pid, 'utf8'));
  } catch {
    return null;
  }
  if (!pid || processIdentity(pid) === null) return null;
  try {
    const line = readFileSync(`/proc/${pid}/cmdline`, 'utf8');
    return line.split('\0').includes(`--datadir=${paths.data}`) ? pid : null;
  } catch {
    return null;
  }
}

/**
 * Starts mariadbd in a session of its own, so that Ctrl-C reaches the command and not the database.
 * Returns once it answers; throws with the reason when it dies before.
 * @param {string} folder
 * @param {Account} account
 * @param {number} port
 * @returns {Promise<number>} its process number
 */
export async function startDaemon(folder, account, port) {
  const paths = daemonPaths(folder);
  const logFrom = sizeOf(paths.log);
  const child = spawn(
    findProgram('mariadbd'),
    [
      '--no-defaults',
      ...(account.asRoot ? ['--user=mysql'] : []),
      `--datadir=${paths.data}`,
      `--tmpdir=${paths.tmp}`,
      `--socket=${paths.socket}`,
      `--pid-file=${paths.pid}`,
      `--log-error=${paths.log}`,
      '--bind-address=127.0.0.1',
      `--port=${port}`,
      '--skip-name-resolve',
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_ci',
      '--innodb-buffer-pool-size=128M',
      '--innodb-flush-log-at-trx-commit=1',
      '--max-allowed-packet=64M',
      '--skip-log-bin',
      '--local-infile=0',
    ],
    { detached: true, stdio: 'ignore', cwd: '/' },
  );
  let ended = false;
  child.once('error', () => (ended = true));
  child.once('exit', () => (ended = true));
  child.unref();
  const until = Date.now() + 120_000;
  while (Date.now() < until) {
    if (ended) throw daemonFault(tail(paths.log, logFrom), folder);
    if (answersOrEnds(folder, child.pid)) return child.pid;
    await delay(100);
  }
  process.kill(child.pid, 'SIGTERM');
  throw new StartFault(
    'MariaDB started, but did not answer within two minutes.',
    `Read the last lines of ${paths.log}, then run the command again.`,
  );
}

/** A server that we started and may not use is not left behind. */
function answersOrEnds(folder, pid) {
  try {
    return answers(folder);
  } catch (error) {
    process.kill(pid, 'SIGTERM');
    throw error;
  }
}

/** Does a server answer on the socket of this folder? */
export function answers(folder) {
  const paths = daemonPaths(folder);
  if (!existsSync(paths.socket)) return false;
  const asked = spawnSync(
    findProgram('mariadb'),
    [
      '--no-defaults',
      `--socket=${paths.socket}`,
      `--user=${administrator()}`,
      '--connect-timeout=3',
      '-e',
      'DO 0',
    ],
    { encoding: 'utf8', timeout: 5_000 },
  );
  if (asked.status === 0) return true;
  if (/ERROR 1698|ERROR 1045/.test(asked.stderr ?? '')) {
    throw new StartFault(
      `The database in ${folder} was made by another account and refuses this one.`,
      'Run the command as the account that ran it first.',
    );
  }
  return false;
}

/**
 * Asks a mariadbd to stop and waits until it is gone.
 * @param {number} pid
 */
export async function stopDaemon(pid) {
  const identity = processIdentity(pid);
  if (identity === null) return;
  try {
    process.kill(pid, 'SIGTERM');
  } catch {
    return;
  }
  const until = Date.now() + 60_000;
  while (processIdentity(pid) === identity && Date.now() < until) await delay(50);
}

/**
 * The sentence for a mariadbd that would not start, from its log.
 * @param {string} log
 * @param {string} folder
 */
export function daemonFault(log, folder) {
  const paths = daemonPaths(folder);
  if (/No space left on device|OS errno 28|errno: 28|Disk is full|Error writing file/i.test(log)) {
    return new StartFault(
      `The disk that holds ${folder} is full: MariaDB cannot start.`,
      'Free at least 500 MB, then run the command again. The data is kept.',
    );
  }
  if (/Address already in use|Bind on TCP\/IP port/i.test(log)) {
    const fault = new StartFault(
      'The port chosen for MariaDB is taken.',
      'Run the command again: another port is chosen.',
    );
    fault.portTaken = true;
    return fault;
  }
  if (/unable to lock|Unable to lock|Can't lock aria control file/i.test(log)) {
    return new StartFault(
      `Another MariaDB already uses the data folder ${paths.data}.`,
      'Stop that server first, then run the command again.',
    );
  }
  if (/Permission denied|errno: 13|OS errno 13|Operation not permitted/i.test(log)) {
    return new StartFault(
      `MariaDB lacks the right to use ${paths.server}.`,
      'Give that folder back to the account that runs MariaDB (mysql when started by root, otherwise your own), then run the command again.',
    );
  }
  const why = log
    .split('\n')
    .filter((line) => /\[ERROR\]|ERROR:/.test(line))
    .at(0);
  return new StartFault(
    `MariaDB did not start${why ? ` (${why.replace(/^.*?\[ERROR\]\s*/, '').trim()})` : ''}.`,
    `Read the last lines of ${paths.log}, mend what they say, then run the command again.`,
  );
}

function sizeOf(file) {
  try {
    return statSync(file).size;
  } catch {
    return 0;
  }
}

function tail(file, from) {
  try {
    return readFileSync(file).subarray(from).toString('utf8');
  } catch {
    return '';
  }
}
