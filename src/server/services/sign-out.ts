import type { Actor, Context } from '../context';

/** Ends the session that the Cookie header carries. Without one there is nothing to end, and that is fine. */
export async function signOut(
  context: Context,
  _actor: Actor | null,
  input: { cookieHeader: string | null },
): Promise<{ setCookie: string }> {
  return { setCookie: await context.sessions.end(input.cookieHeader) };
}
