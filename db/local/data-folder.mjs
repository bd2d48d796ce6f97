import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, statSync } from 'node:fs';
import { homedir } from 'node:os';
import { dirname, join } from 'node:path';
import { StartFault } from './start-fault.mjs';

/** A Unix socket's path may hold 107 bytes; "/server/s.sock" and a margin are taken off it. */
const longestFolder = 85;

/**
 * Where the local database of a checkout lives. In `.data/` of the checkout when the account that
 * runs MariaDB can get there; otherwise outside, under a name made from the checkout's path.
 * @param {string} checkout absolute path of the checkout
 * @param {string} name 'demo' or 'test'
 * @param {{ asRoot: boolean }} account
 * @returns {string} a folder that exists
 */
export function dataFolder(checkout, name, account) {
  const inside = join(checkout, '.data', name);
  const fits = Buffer.byteLength(inside) <= longestFolder;
  const folder =
    fits && (!account.asRoot || passable(checkout)) ? inside : outside(checkout, name, account);
  try {
    mkdirSync(folder, { recursive: true, mode: 0o711 });
  } catch (error) {
    throw new StartFault(
      `The folder ${folder} for the database cannot be made (${error.code ?? error.message}).`,
      `Give this account the right to write in ${nearestExisting(folder)}, then run the command again.`,
    );
  }
  return folder;
}

function outside(checkout, name, account) {
  const hash = createHash('sha256').update(checkout).digest('hex').slice(0, 12);
  const base = account.asRoot ? '/var/lib' : join(homedir(), '.local', 'share');
  return join(base, `dipwright-${hash}`, name);
}

/** Can any account walk down to this folder? */
function passable(folder) {
  for (let at = folder; ; at = dirname(at)) {
    if ((statSync(at).mode & 0o001) === 0) return false;
    if (at === dirname(at)) return true;
  }
}

function nearestExisting(folder) {
  let at = folder;
  while (!existsSync(at)) at = dirname(at);
  return at;
}
