import { closeSync, openSync, readFileSync, rmSync, writeSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as delay } from 'node:timers/promises';
import { processIdentity } from './process-identity.mjs';
import { StartFault } from './start-fault.mjs';

/**
 * One command at a time starts or stops the server of a folder. The lock of a command that was
 * killed is taken over.
 * @template T
 * @param {string} folder
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withFolderLock(folder, work) {
  const file = join(folder, 'lock');
  const until = Date.now() + 180_000;
  while (!take(file)) {
    if (Date.now() > until) {
      throw new StartFault(
        `Another command has been starting or stopping the database in ${folder} for three minutes.`,
        `Wait for it, or end it; then delete ${file} and run the command again.`,
      );
    }
    await delay(100);
  }
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}

function take(file) {
  try {
    const handle = openSync(file, 'wx', 0o600);
    writeSync(handle, processIdentity(process.pid) ?? '');
    closeSync(handle);
    return true;
  } catch (error) {
    if (error.code !== 'EEXIST') throw error;
  }
  let holder;
  try {
    holder = readFileSync(file, 'utf8');
  } catch {
    return false;
  }
  if (holder !== '' && processIdentity(Number(holder.split(':')[0])) !== holder) {
    rmSync(file, { force: true });
  }
  return false;
}
