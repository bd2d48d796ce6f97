import { DipwrightError } from '~/domain/errors';

const most = 2;
/** More than these wait too long to be worth it, and each holds a password in memory. */
const mostWaiting = 100;
let running = 0;
const waiting: (() => void)[] = [];

/** Runs at most two of these at once, the rest in order: hashing takes 19 MiB and a core each. */
export async function oneOfTwo<T>(work: () => Promise<T>): Promise<T> {
  if (waiting.length >= mostWaiting) {
    throw new DipwrightError(
      'rate-limited',
      'Too many people sign in at this moment: try again in 10 s.',
      {
        facts: { retryAfterS: 10 },
      },
    );
  }
  if (running >= most) await new Promise<void>((resolve) => waiting.push(resolve));
  else running += 1;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next === undefined) running -= 1;
    else next();
  }
}
