import { execFileSync } from 'node:child_process';
import { userInfo } from 'node:os';
import { StartFault } from './start-fault.mjs';

/**
 * The account that runs MariaDB: `mysql` when we are root (the server is never run as root),
 * otherwise our own.
 * @returns {{ asRoot: boolean, self: string, uid?: number, gid?: number }}
 */
export function daemonAccount() {
  const self = userInfo().username;
  if (process.getuid?.() !== 0) return { asRoot: false, self };
  try {
    const id = (flag) =>
      Number(execFileSync('id', [flag, 'mysql'], { encoding: 'utf8', stdio: 'pipe' }));
    return { asRoot: true, self, uid: id('-u'), gid: id('-g') };
  } catch {
    throw new StartFault(
      'There is no account named mysql, and MariaDB must not run as root.',
      'Make one with: adduser --system --group --no-create-home mysql. Then run the command again.',
    );
  }
}
