import { setTimeout as delay } from 'node:timers/promises';
import { portState } from '../../../db/local/free-port.mjs';
import { StartFault } from '../../../db/local/start-fault.mjs';

/**
 * Throws unless the port can be listened on. A port just left by an earlier run may take a moment.
 * @param {{ host: string, port: number }} address
 * @param {string} command how the person started this, for the next step
 */
export async function requireWebPort({ host, port }, command, patienceMs = 3_000) {
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new StartFault(
      'DIPWRIGHT_PORT is not a port.',
      `Choose a whole number from 1 to 65535: DIPWRIGHT_PORT=4321 ${command}`,
    );
  }
  const until = Date.now() + patienceMs;
  let state = await portState(port, host);
  while (state === 'taken' && Date.now() < until) {
    await delay(200);
    state = await portState(port, host);
  }
  if (state === 'free') return;
  const next = `DIPWRIGHT_PORT=${port < 1024 ? 4321 : port + 1} ${command}`;
  if (state === 'forbidden') {
    throw new StartFault(
      `This account may not listen on port ${port}.`,
      `Choose a port from 1024 on: ${next}`,
    );
  }
  if (state === 'no-address') {
    throw new StartFault(
      `This machine has no address ${host} to listen on.`,
      `Choose another: DIPWRIGHT_HOST=127.0.0.1 ${command}`,
    );
  }
  throw new StartFault(
    `Port ${port} of ${host} is taken by another program (perhaps Dipwright runs already).`,
    `Stop that program, or choose another port: ${next}`,
  );
}
