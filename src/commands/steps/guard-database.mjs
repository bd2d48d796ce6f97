import { say } from './say.mjs';

/**
 * Watches the local MariaDB and starts it again when it was killed. Gives up when it dies three
 * times within a minute.
 * @param {{ lives(): boolean, restart(): Promise<void>, log: string }} server
 * @returns {{ lost: Promise<{ lost: Error }>, end(): void }} `lost` resolves when it cannot be kept alive
 */
export function guardDatabase(server, everyMs = 500) {
  let onLost;
  const lost = new Promise((resolve) => (onLost = (error) => resolve({ lost: error })));
  let busy = false;
  let restarts = [];
  const timer = setInterval(async () => {
    if (busy || server.lives()) return;
    busy = true;
    try {
      restarts = restarts.filter((at) => Date.now() - at < 60_000);
      if (restarts.length === 3)
        throw new Error(`MariaDB stopped three times within a minute; its log is ${server.log}.`);
      restarts.push(Date.now());
      say('MariaDB stopped unexpectedly; starting it again.');
      await server.restart();
    } catch (error) {
      clearInterval(timer);
      onLost(error);
    } finally {
      busy = false;
    }
  }, everyMs);
  return { lost, end: () => clearInterval(timer) };
}
