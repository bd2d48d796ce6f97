import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { processIdentity } from './process-identity.mjs';

/*
 * Which commands use a folder now (a database's, a build's): one small file each. What belongs to
 * the folder is ended or removed only when nobody uses it; a file whose command was killed counts
 * for nothing.
 */

/** @param {string} folder */
export function joinFolder(folder) {
  mkdirSync(usersOf(folder), { recursive: true, mode: 0o700 });
  writeFileSync(join(usersOf(folder), String(process.pid)), processIdentity(process.pid) ?? '');
}

/** @param {string} folder */
export function leaveFolder(folder) {
  rmSync(join(usersOf(folder), String(process.pid)), { force: true });
}

/**
 * @param {string} folder
 * @returns {boolean} true while a living command uses it, this one included
 */
export function isFolderUsed(folder) {
  let names = [];
  try {
    names = readdirSync(usersOf(folder));
  } catch {
    return false;
  }
  return names.some(
    (name) => processIdentity(Number(name)) === readUser(join(usersOf(folder), name)),
  );
}

function readUser(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return '';
  }
}

function usersOf(folder) {
  return join(folder, 'users');
}
