import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
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
  if (readStamp(stampFile) === wanted) return;
  say('Installing the npm packages (one to two minutes, once).');
  const { code, output } = await runProgram(
    'npm',
    ['ci', '--no-audit', '--no-fund', '--fetch-retry-mintimeout=2000', '--fetch-retry-maxtimeout=10000'],
    { cwd: checkout, env: { NODE_ENV: undefined } },
  );
  if (code !== 0) throw npmFault(output);
  writeFileSync(stampFile, wanted);
}

function stampOf(checkout) {
  const lock = readFileSync(join(checkout, 'package-lock.json'));
  return createHash('sha256').update(lock).update(process.version).digest('hex');
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
    return new StartFault('The disk is full: the npm packages could not be installed.', 'Free at least 1 GB, then run the command again.');
  }
  if (/ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ECONNRESET|ETIMEDOUT|ENETUNREACH|EHOSTUNREACH|network/i.test(output)) {
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
  const why = output.split('\n').filter((line) => /^npm (error|ERR!)/.test(line)).at(0);
  return new StartFault(
    `The npm packages could not be installed${why ? ` (${why.replace(/^npm (error|ERR!)\s*/, '').trim()})` : ''}.`,
    'Run: npm ci, and mend what it says. Then run the command again.',
  );
}
