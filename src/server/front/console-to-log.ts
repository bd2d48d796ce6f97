import type { Log } from '../log';

/**
 * Whatever a library prints goes through the log, where secrets are kept out: printed whole, an
 * error of a database driver shows the connection's password.
 */
export function sendConsoleToLog(log: Log): void {
  const to =
    (write: Log['info']) =>
    (...parts: unknown[]) => {
      const text = parts.filter((part) => typeof part === 'string').join(' ');
      const rest = parts.filter((part) => typeof part !== 'string');
      write(text || 'console', rest.length > 0 ? { details: rest } : {});
    };
  console.log = console.info = to(log.info);
  console.debug = to(log.debug);
  console.warn = to(log.warn);
  console.error = to(log.error);
}
