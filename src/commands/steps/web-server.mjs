import { fork } from 'node:child_process';
import { join } from 'node:path';
import { StartFault } from '../../../db/local/start-fault.mjs';

/**
 * Starts the built product and waits until it serves. The channel between the two ends with either,
 * so that a web server whose command was killed leaves by itself.
 * @param {string} checkout
 * @param {string} build folder of the build
 * @param {Record<string, string>} settings
 * @param {{ quiet?: boolean }} [options] `quiet`: its log goes nowhere
 */
export async function startWebServer(checkout, build, settings, { quiet = false } = {}) {
  const child = fork(join(build, 'server', 'dipwright.mjs'), [], {
    cwd: checkout,
    env: { ...process.env, NODE_ENV: 'production', ...settings },
    execArgv: ['--enable-source-maps'],
    // A session of its own: Ctrl-C reaches the command, which asks the server to leave.
    detached: true,
    stdio: quiet ? ['ignore', 'ignore', 'ignore', 'ipc'] : ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  const ended = new Promise((resolve) =>
    child.once('exit', (code, signal) => resolve({ code, signal })),
  );
  const outcome = await Promise.race([
    new Promise((resolve) => child.on('message', resolve)),
    ended.then(() => ({ fault: 'it ended at once' })),
  ]);
  if (outcome.fault !== undefined) {
    throw new StartFault(
      `The web server did not start: ${String(outcome.fault).slice(0, 500)}`,
      'Mend what it says (docs/operations.md lists every setting), then run the command again.',
    );
  }
  return {
    pid: child.pid,
    ended,
    async stop() {
      child.kill('SIGTERM');
      await ended;
    },
  };
}
