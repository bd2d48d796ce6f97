import type { Config } from './config';

export type LogLevel = Config['log']['level'];
export type Facts = Readonly<Record<string, unknown>>;

/** One JSON object a line: time, level, what happened, facts. */
export interface Log {
  debug(message: string, facts?: Facts): void;
  info(message: string, facts?: Facts): void;
  warn(message: string, facts?: Facts): void;
  error(message: string, facts?: Facts): void;
}

const order: readonly LogLevel[] = ['debug', 'info', 'warn', 'error'];
const secretName = /password|secret|token|cookie|authorization|session|api-?key|device-?key/i;
const longestText = 2_000;

/**
 * A log that writes lines at or above `level`. Values under names that sound like secrets are
 * replaced, at any depth; of errors only name, message, code and place are written, since a
 * database driver hangs its connection settings on them.
 */
export function createLog(level: LogLevel, write: (line: string) => void = toStandardOut): Log {
  const least = order.indexOf(level);
  const at =
    (own: LogLevel) =>
    (message: string, facts: Facts = {}) => {
      if (order.indexOf(own) < least) return;
      const entry = {
        time: new Date().toISOString(),
        level: own,
        message,
        ...(safe(facts, 0) as Facts),
      };
      write(`${JSON.stringify(entry)}\n`);
    };
  return { debug: at('debug'), info: at('info'), warn: at('warn'), error: at('error') };
}

function toStandardOut(line: string): void {
  process.stdout.write(line);
}

function safe(value: unknown, depth: number): unknown {
  if (value instanceof Error) return errorFacts(value, depth);
  if (typeof value === 'string')
    return value.length > longestText ? `${value.slice(0, longestText)}…` : value;
  if (typeof value === 'bigint') return String(value);
  if (typeof value !== 'object' || value === null) return value;
  if (depth > 5) return '…';
  if (Array.isArray(value)) return value.slice(0, 100).map((item) => safe(item, depth + 1));
  return Object.fromEntries(
    Object.entries(value).map(([name, item]) => [
      name,
      secretName.test(name) ? '[kept out]' : safe(item, depth + 1),
    ]),
  );
}

function errorFacts(error: Error, depth: number): Facts {
  const code = (error as { code?: unknown }).code;
  return {
    name: error.name,
    message: safe(error.message, depth),
    ...(code === undefined ? {} : { code }),
    ...(error.stack ? { at: frames(error.stack) } : {}),
    ...(error.cause === undefined || depth > 3 ? {} : { cause: safe(error.cause, depth + 1) }),
  };
}

/** The frames only: the first lines repeat the message, which may be long. */
function frames(stack: string): string[] {
  return stack
    .split('\n')
    .filter((line) => line.startsWith('    at '))
    .slice(0, 12)
    .map((line) => line.trim());
}
