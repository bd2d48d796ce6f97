import { StartFault } from '../../../db/local/start-fault.mjs';

/**
 * Turns SIGINT, SIGTERM and SIGHUP into a promise, so that a command can end in its own order. A
 * person who presses Ctrl-C twice waits as long as one who presses it once.
 */
export function untilAskedToStop() {
  let ask;
  const asked = new Promise((resolve) => (ask = resolve));
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => ask({ signal }));
  return {
    asked,
    /**
     * Waits for a step, unless a stop is asked for first.
     * @template T
     * @param {Promise<T>} step
     * @returns {Promise<T>}
     */
    async during(step) {
      const done = await Promise.race([step.then((value) => ({ value })), asked]);
      if ('signal' in done) {
        step.catch(() => undefined);
        throw new StartFault(
          'Stopped before it was ready.',
          'Run the command again; what was done is kept.',
        );
      }
      return done.value;
    },
  };
}
