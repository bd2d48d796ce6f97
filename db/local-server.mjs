import { statfsSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';
import { ensureAccount, portOf } from './local/administer.mjs';
import { newCredentials, readCredentials, writeCredentials } from './local/credentials.mjs';
import { daemonAccount } from './local/daemon-account.mjs';
import {
  answers,
  daemonPaths,
  makeSystemTables,
  runningDaemon,
  startDaemon,
  stopDaemon,
} from './local/daemon.mjs';
import { dataFolder } from './local/data-folder.mjs';
import { ensurePrograms } from './local/debian-packages.mjs';
import { withFolderLock } from './local/folder-lock.mjs';
import { isFolderUsed, joinFolder, leaveFolder } from './local/folder-users.mjs';
import { anyFreePort, portState } from './local/free-port.mjs';
import { processIdentity } from './local/process-identity.mjs';
import { StartFault } from './local/start-fault.mjs';

/** What a local server needs of Debian; asked for first by commands, before anything that takes long. */
export const databasePrograms = ['mariadbd', 'mariadb-install-db', 'mariadb'];

/**
 * The project's own MariaDB: a data folder of its own, loopback only, an account without rights
 * elsewhere, a port that is chosen once and remembered. Needs no installed npm package.
 *
 * A server that already runs on the folder is used and not started again; the last command that
 * uses it stops it.
 * @param {{
 *   checkout: string, name: 'demo' | 'test', database: string, scratchPrefix?: string,
 *   say: (line: string) => void,
 * }} options
 */
export async function openLocalServer({ checkout, name, database, scratchPrefix, say }) {
  ensurePrograms(databasePrograms, say);
  const account = daemonAccount();
  const folder = dataFolder(checkout, name, account);
  const place = { folder, account, say };
  let running = await withFolderLock(folder, async () => {
    const opened = await findOrStart(place);
    ensureAccount(folder, opened.credentials, { database, scratchPrefix });
    joinFolder(folder);
    return opened;
  });
  const { socket, log } = daemonPaths(folder);

  return {
    host: '127.0.0.1',
    port: running.credentials.port,
    user: running.credentials.user,
    password: running.credentials.password,
    database,
    folder,
    socket,
    log,
    get pid() {
      return running.pid;
    },
    /** Is the server still there? */
    lives: () => processIdentity(running.pid) !== null,
    /** Starts it again after it was killed, on the same port and data. */
    async restart() {
      running = await withFolderLock(folder, () => findOrStart({ ...place, keepPort: true }));
    },
    /** Stops it, unless another living command uses it. */
    async stop() {
      await withFolderLock(folder, async () => {
        leaveFolder(folder);
        if (!isFolderUsed(folder)) await stopDaemon(running.pid);
      });
    },
  };
}

async function findOrStart({ folder, account, say, keepPort = false }) {
  let credentials = readCredentials(folder);
  const pid = await settledDaemon(folder, say);
  if (credentials === null) {
    credentials = newCredentials(pid === null ? await anyFreePort() : portOf(folder));
    writeCredentials(folder, credentials);
  }
  if (pid !== null) {
    say(`MariaDB already runs on 127.0.0.1:${credentials.port}; using it.`);
    return { pid, credentials };
  }
  requireSpace(folder);
  if (makeSystemTables(folder, account)) say(`Made a new database folder: ${folder}`);
  const started = await startOnFreePort(folder, account, credentials, keepPort);
  say(`MariaDB runs on 127.0.0.1:${started.credentials.port}.`);
  return started;
}

/** The server that already runs on this folder, once it answers; null when none runs. */
async function settledDaemon(folder, say) {
  const until = Date.now() + 60_000;
  let told = false;
  for (;;) {
    const pid = runningDaemon(folder);
    if (pid === null) return null;
    if (answers(folder)) return pid;
    if (Date.now() > until) {
      throw new StartFault(
        `A MariaDB (process ${pid}) holds the data folder ${folder} but does not answer.`,
        `Stop it with: kill ${pid}. Then run the command again; the data is kept.`,
      );
    }
    if (!told) say('Waiting for the MariaDB that is already starting or stopping.');
    told = true;
    await delay(200);
  }
}

async function startOnFreePort(folder, account, credentials, keepPort) {
  for (let attempt = 1; ; attempt += 1) {
    if (!keepPort && !(await becomesFree(credentials.port))) {
      credentials = { ...credentials, port: await anyFreePort() };
      writeCredentials(folder, credentials);
    }
    try {
      return { pid: await startDaemon(folder, account, credentials.port), credentials };
    } catch (error) {
      if (!error.portTaken || attempt === 5) throw error;
    }
  }
}

/** A server that was just killed lets go of its port a moment after it is gone. */
async function becomesFree(port) {
  const until = Date.now() + 2_000;
  while ((await portState(port)) !== 'free') {
    if (Date.now() > until) return false;
    await delay(100);
  }
  return true;
}

function requireSpace(folder) {
  const disk = statfsSync(folder);
  const freeMb = Math.floor((disk.bavail * disk.bsize) / 1_000_000);
  if (freeMb < 300) {
    throw new StartFault(
      `Only ${freeMb} MB are left on the disk that holds ${folder}.`,
      'Free at least 500 MB, then run the command again. The data is kept.',
    );
  }
}
