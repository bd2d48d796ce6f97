import type { SignIn } from '~/domain/access/account';
import { DipwrightError } from '~/domain/errors';
import { passwordFits } from '../auth/passwords';
import { delaySeconds, forgottenAfterSeconds } from '../auth/sign-in-delay';
import { tokenHash } from '../auth/token-hash';
import type { Context } from '../context';
import { findFirstMembership } from '../database/repositories/memberships';
import { countAttempt, forgetAttempts } from '../database/repositories/sign-in-attempts';
import { findUserByEmail } from '../database/repositories/users';

/**
 * Begins a new session and ends the one the browser held. An unknown address walks the same way
 * through, with the same words: nobody learns who has an account.
 */
export async function signIn(
  context: Context,
  _actor: null,
  input: SignIn & { cookieHeader?: string | null },
): Promise<{ setCookie: string }> {
  const { database, sessions } = context;
  const account = tokenHash(input.email);
  await countOrRefuse(context, account);
  const user = await findUserByEmail(database, input.email);
  const fits = await passwordFits(user?.passwordHash ?? null, input.password);
  const membership = user !== null && fits ? await findFirstMembership(database, user.id) : null;
  if (membership === null) {
    throw new DipwrightError(
      'unauthenticated',
      'Address and password do not fit together. Check both and try again.',
    );
  }
  await forgetAttempts(database, account);
  await sessions.end(input.cookieHeader ?? null);
  return { setCookie: await sessions.begin(membership) };
}

/** Counts the attempt as failed until it has succeeded; refuses it while the account waits. */
async function countOrRefuse(context: Context, account: string): Promise<void> {
  const now = context.clock.now();
  const waits = (until: Date): boolean => until > now;
  const kept = await countAttempt(context.database, account, (attempt) => {
    if (waits(attempt.blockedUntil)) return null;
    const old = attempt.lastAt.getTime() < now.getTime() - forgottenAfterSeconds * 1000;
    const failures = (old ? 0 : attempt.failures) + 1;
    const blockedUntil = new Date(now.getTime() + delaySeconds(failures) * 1000);
    return { failures, lastAt: now, blockedUntil };
  });
  if (!waits(kept.blockedUntil)) return;
  const retryAfterS = Math.ceil((kept.blockedUntil.getTime() - now.getTime()) / 1000);
  throw new DipwrightError(
    'rate-limited',
    `Too many wrong passwords for this address: try again in ${retryAfterS} s.`,
    { facts: { retryAfterS } },
  );
}
