import { randomBytes } from 'node:crypto';
import { readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { StartFault } from './start-fault.mjs';

/**
 * @typedef {{ port: number, user: string, password: string }} Credentials
 */

/**
 * The port and the application's password of a data folder, made once and kept in a file that only
 * the owner can read.
 * @param {string} folder
 * @returns {Credentials | null} null when there are none yet
 */
export function readCredentials(folder) {
  let text;
  try {
    text = readFileSync(fileOf(folder), 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT') return null;
    throw new StartFault(
      `The file ${fileOf(folder)} cannot be read (${error.code}).`,
      'Run the command as the account that ran it first, or give this account the right to read that file.',
    );
  }
  try {
    return JSON.parse(text);
  } catch {
    throw new StartFault(
      `The file ${fileOf(folder)} is damaged.`,
      'Delete that file and run the command again: a new password is made, the data stays.',
    );
  }
}

/** @returns {Credentials} */
export function newCredentials(port) {
  return { port, user: 'dipwright', password: randomBytes(24).toString('base64url') };
}

/**
 * @param {string} folder
 * @param {Credentials} credentials
 */
export function writeCredentials(folder, credentials) {
  const draft = `${fileOf(folder)}.new`;
  writeFileSync(draft, `${JSON.stringify(credentials, null, 2)}\n`, { mode: 0o600, flush: true });
  renameSync(draft, fileOf(folder));
}

function fileOf(folder) {
  return join(folder, 'credentials.json');
}
