import { spawnSync } from 'node:child_process';
import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { StartFault } from './start-fault.mjs';

/** Which program proves that which Debian package is there. */
export const packageOfProgram = {
  mariadbd: 'mariadb-server',
  'mariadb-install-db': 'mariadb-server',
  mariadb: 'mariadb-server',
  chromium: 'chromium',
  pdftotext: 'poppler-utils',
  pdftoppm: 'poppler-utils',
};

/**
 * Full path of a program, or null. Looks in sbin too, which plain accounts lack in their PATH.
 * @param {string} program
 */
export function findProgram(program) {
  const folders = [
    ...(process.env.PATH ?? '').split(delimiter),
    '/usr/sbin',
    '/usr/bin',
    '/sbin',
    '/bin',
  ];
  for (const folder of folders) {
    if (!folder) continue;
    try {
      accessSync(join(folder, program), constants.X_OK);
      return join(folder, program);
    } catch {
      // Not here; look further.
    }
  }
  return null;
}

/**
 * Installs the Debian packages of the programs that are missing; does nothing when none is.
 * @param {(keyof typeof packageOfProgram)[]} programs
 * @param {(line: string) => void} say
 */
export function ensurePrograms(programs, say) {
  const missing = [
    ...new Set(programs.filter((name) => !findProgram(name)).map((name) => packageOfProgram[name])),
  ];
  if (missing.length === 0) return;
  const list = missing.join(' ');
  if (!findProgram('apt-get')) {
    throw new StartFault(
      `The program package ${list} is not installed, and this is not Debian, where it could be installed by itself.`,
      `Install ${list} (MariaDB 10.11 or later) by your own means, then run the command again.`,
    );
  }
  const prefix = elevation();
  if (prefix === null) {
    throw new StartFault(
      `The program package ${list} is not installed, and this account may not install it.`,
      `Ask an administrator to run: apt-get install --no-install-recommends ${list}. Then run the command again.`,
    );
  }
  say(`Installing from Debian: ${list} (about a minute, once).`);
  runApt(prefix, ['update'], list);
  runApt(prefix, ['install', '-y', '--no-install-recommends', ...missing], list);
  const still = programs.filter((name) => !findProgram(name));
  if (still.length > 0) {
    throw new StartFault(
      `Debian's ${list} was installed, but the program ${still[0]} is still missing.`,
      `Run: apt-get install --reinstall ${list}. Then run the command again.`,
    );
  }
}

/** [] as root, ['sudo', '-n'] where that works without a question, otherwise null. */
function elevation() {
  if (process.getuid?.() === 0) return [];
  if (!findProgram('sudo')) return null;
  return spawnSync('sudo', ['-n', 'true'], { stdio: 'ignore' }).status === 0
    ? ['sudo', '-n']
    : null;
}

function runApt(prefix, args, list) {
  const [program, ...rest] = [
    ...prefix,
    'env',
    'DEBIAN_FRONTEND=noninteractive',
    'apt-get',
    '-q',
    '-o',
    'DPkg::Lock::Timeout=500',
    ...args,
  ];
  const done = spawnSync(program, rest, { encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 });
  if (done.status === 0) return;
  throw aptFault(`${done.stdout ?? ''}\n${done.stderr ?? ''}`, list);
}

/**
 * The sentence for a failed apt-get, from what it printed.
 * @param {string} output
 * @param {string} list
 */
export function aptFault(output, list) {
  if (/No space left on device|n.?t have enough free space/i.test(output)) {
    return new StartFault(
      `The disk is full: Debian's ${list} could not be installed.`,
      'Free at least 1 GB, then run the command again.',
    );
  }
  if (
    /Could not resolve|Temporary failure resolving|Unable to connect|Failed to fetch|Connection timed out/i.test(
      output,
    )
  ) {
    return new StartFault(
      `The Debian package archive cannot be reached, and ${list} is not installed.`,
      'Connect this machine to the network, or set the proxy in /etc/apt, then run the command again.',
    );
  }
  const why = output
    .split('\n')
    .filter((line) => /^(E:|dpkg: error)/.test(line))
    .at(-1);
  return new StartFault(
    `Debian's ${list} could not be installed${why ? ` (${why.replace(/^E:/, '').trim()})` : ''}.`,
    `Run: apt-get install --no-install-recommends ${list}, and mend what it says. Then run the command again.`,
  );
}
