import { createHash } from 'node:crypto';
import { readFileSync, statfsSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { StartFault } from '../../../db/local/start-fault.mjs';
import { runProgram } from './run-program.mjs';
import { say } from './say.mjs';

/**
 * `npm ci`, only when the lock file or the Node version differs from the last time it was run.
 * @param {string} checkout
 */
export async function installPackages(checkout) {
  const stampFile = join(checkout, 'node_modules', '.dipwright-installed');
  const wanted = stampOf(checkout);
  const last = readStamp(stampFile);
  if (last === wanted) return;
  if (last === null && installedByHand(checkout)) return writeFileSync(stampFile, wanted);
  requireSpace(checkout);
  say('Installing the npm packages (one to two minutes, once).');
  const { code, output } = await runProgram(
    'npm',
    [
      'ci',
      '--no-audit',
      '--no-fund',
      '--fetch-retry-mintimeout=2000',
      '--fetch-retry-maxtimeout=10000',
    ],
    { cwd: checkout, env: { NODE_ENV: undefined } },
  );
  if (code !== 0) throw npmFault(output);
  writeFileSync(stampFile, wanted);
}

/** The packages take about 600 MB, and a disk that fills up on the way takes minutes to say so. */
function requireSpace(checkout) {
  const disk = statfsSync(checkout);
  const freeMb = Math.floor((disk.bavail * disk.bsize) / 1_000_000);
  if (freeMb >= 1_000) return;
  throw new StartFault(
    `Only ${freeMb} MB are left on the disk that holds ${checkout}, and the npm packages need more.`,
    'Free at least 1 GB, then run the command again.',
  );
}

function stampOf(checkout) {
  const lock = readFileSync(join(checkout, 'package-lock.json'));
  return createHash('sha256').update(lock).update(process.version).digest('hex');
}

/** Did a person run `npm ci` before? npm notes in node_modules what it put there. */
function installedByHand(checkout) {
  const packagesOf = (file) => JSON.parse(readFileSync(join(checkout, file), 'utf8')).packages;
  try {
    const installed = packagesOf('node_modules/.package-lock.json');
    const wanted = packagesOf('package-lock.json');
    const same = (path) =>
      installed[path]?.version === wanted[path].version &&
      installed[path]?.integrity === wanted[path].integrity;
    // Packages for other machines (optional, by system or processor) are in the lock file only.
    return Object.keys(wanted).every((path) => path === '' || wanted[path].optional || same(path));
  } catch {
    return false;
  }
}

function readStamp(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return null;
  }
}

/**
 * The sentence for a failed `npm ci`, from what it printed.
 * @param {string} output
 */
export function npmFault(output) {
  if (/ENOSPC|no space left/i.test(output)) {
    return new StartFault(
      'The disk is full: the npm packages could not be installed.',
      'Free at least 1 GB, then run the command again.',
    );
  }
  if (
    /ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ECONNRESET|ETIMEDOUT|ENETUNREACH|EHOSTUNREACH|network/i.test(
      output,
    )
  ) {
    return new StartFault(
      'The npm registry cannot be reached, and the packages are not installed yet.',
      'Connect this machine to the network, or set your registry with: npm config set registry ADDRESS. Then run the command again.',
    );
  }
  if (/EACCES|EPERM/.test(output)) {
    return new StartFault(
      'This account lacks the right to write node_modules.',
      'Run the command as the account that owns this checkout, or delete node_modules, then run it again.',
    );
  }
  const why = output
    .split('\n')
    .filter((line) => /^npm (error|ERR!)/.test(line))
    .at(0);
  return new StartFault(
    `The npm packages could not be installed${why ? ` (${why.replace(/^npm (error|ERR!)\s*/, '').trim()})` : ''}.`,
    'Run: npm ci, and mend what it says. Then run the command again.',
  );
}
