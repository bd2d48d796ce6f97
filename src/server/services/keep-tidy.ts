import { forgottenAfterSeconds } from '../auth/sign-in-delay';
import type { Context } from '../context';
import { forgetAttemptsBefore } from '../database/repositories/sign-in-attempts';

const hourMs = 3_600_000;

/** Every hour, removes sessions that are over and failed sign-ins that no longer count. Returns how to stop it. */
export function keepTidy(
  context: Pick<Context, 'database' | 'sessions' | 'clock' | 'log'>,
): () => void {
  const timer = setInterval(() => void tidy(context), hourMs);
  timer.unref();
  return () => clearInterval(timer);
}

export async function tidy(
  context: Pick<Context, 'database' | 'sessions' | 'clock' | 'log'>,
): Promise<void> {
  try {
    const old = new Date(context.clock.now().getTime() - forgottenAfterSeconds * 1000);
    await context.sessions.removeExpired();
    await forgetAttemptsBefore(context.database, old);
  } catch (error) {
    context.log.warn('old sessions were not removed; the next try is in an hour', { error });
  }
}
