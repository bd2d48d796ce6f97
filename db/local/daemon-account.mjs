import { execFileSync } from 'node:child_process';
import { StartFault } from './start-fault.mjs';

/**
 * The account that runs MariaDB: `mysql` when we are root (the server is never run as root),
 * otherwise our own.
 * @returns {{ asRoot: boolean, uid?: number, gid?: number }}
 */
export function daemonAccount() {
  if (process.getuid?.() !== 0) return { asRoot: false };
  try {
    const id = (flag) =>
      Number(execFileSync('id', [flag, 'mysql'], { encoding: 'utf8', stdio: 'pipe' }));
    return { asRoot: true, uid: id('-u'), gid: id('-g') };
  } catch {
    throw new StartFault(
      'There is no account named mysql, and MariaDB must not run as root.',
      'Make one with: adduser --system --group --no-create-home mysql. Then run the command again.',
    );
  }
}
