import { spawnSync } from 'node:child_process';
import { administrator } from './administrator.mjs';
import { daemonPaths } from './daemon.mjs';
import { findProgram } from './debian-packages.mjs';
import { StartFault } from './start-fault.mjs';

/**
 * Runs statements with all rights, over the server's socket. The text goes by standard input, so that
 * no password shows in the list of processes.
 * @param {string} folder
 * @param {string} statements
 */
export function administer(folder, statements) {
  const done = spawnSync(
    findProgram('mariadb'),
    [
      '--no-defaults',
      `--socket=${daemonPaths(folder).socket}`,
      `--user=${administrator()}`,
      '--batch',
      '--skip-column-names',
    ],
    { encoding: 'utf8', input: statements },
  );
  if (done.status === 0) return done.stdout;
  const why = (done.stderr ?? '').split('\n').find((line) => line.startsWith('ERROR'));
  throw new StartFault(
    `MariaDB refused to set up the application's account${why ? ` (${why.split(' at line')[0]})` : ''}.`,
    'Run the command as the account that ran it first.',
  );
}

/** The port that the running server of this folder listens on. */
export function portOf(folder) {
  return Number(administer(folder, 'SELECT @@port;'));
}

/**
 * Makes the application's account (its password follows the credentials file) and its databases.
 * @param {string} folder
 * @param {{ user: string, password: string }} credentials
 * @param {{ database: string, scratchPrefix?: string }} wanted `scratchPrefix`: databases whose
 *   names begin so may be made and dropped by the application's account (tests only)
 */
export function ensureAccount(folder, credentials, wanted) {
  const user = `'${credentials.user}'@'127.0.0.1'`;
  const lines = [
    `CREATE DATABASE IF NOT EXISTS \`${wanted.database}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;`,
    `CREATE USER IF NOT EXISTS ${user} IDENTIFIED BY '${credentials.password}';`,
    `ALTER USER ${user} IDENTIFIED BY '${credentials.password}';`,
    `GRANT ALL PRIVILEGES ON \`${wanted.database.replaceAll('_', '\\_')}\`.* TO ${user};`,
  ];
  if (wanted.scratchPrefix) {
    lines.push(
      `GRANT ALL PRIVILEGES ON \`${wanted.scratchPrefix.replaceAll('_', '\\_')}%\`.* TO ${user};`,
    );
  }
  administer(folder, lines.join('\n'));
}
