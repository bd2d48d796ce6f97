import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { processIdentity } from './process-identity.mjs';

/*
 * Which commands use the server of a folder now: one small file each. The last one out stops the
 * server; a file whose command was killed counts for nothing.
 */

/** @param {string} folder */
export function joinServer(folder) {
  mkdirSync(usersFolder(folder), { recursive: true, mode: 0o700 });
  writeFileSync(join(usersFolder(folder), String(process.pid)), processIdentity(process.pid) ?? '');
}

/**
 * @param {string} folder
 * @returns {boolean} true when no other living command uses the server
 */
export function leaveServer(folder) {
  rmSync(join(usersFolder(folder), String(process.pid)), { force: true });
  let others = 0;
  for (const name of readdirSync(usersFolder(folder))) {
    const file = join(usersFolder(folder), name);
    if (processIdentity(Number(name)) === readFileSync(file, 'utf8')) others += 1;
    else rmSync(file, { force: true });
  }
  return others === 0;
}

function usersFolder(folder) {
  return join(folder, 'users');
}
