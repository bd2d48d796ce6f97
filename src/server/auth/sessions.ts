import { Lucia, TimeSpan } from 'lucia';
import type { Actor } from '~/domain/access/actor';
import type { Database } from '../database/connect';
import { findMembership } from '../database/repositories/memberships';
import { luciaAdapter } from './lucia-adapter';

/** Without use a session ends after a week; with use after thirty days. */
export const idleDays = 7;
export const longestDays = 30;
const longestSeconds = longestDays * 24 * 3600;

/** Sign-in sessions: a random token in a cookie, its hash and its two ends in the database. */
export interface Sessions {
  cookieName: string;
  /** Begins a session; returns the Set-Cookie header that carries it. */
  begin(member: { userId: string; workshopId: string }): Promise<string>;
  /** Who the Cookie header of a request stands for; null without a live session. */
  readActor(cookieHeader: string | null): Promise<Actor | null>;
  /** Ends the session of that Cookie header, if any; returns the Set-Cookie header that removes it. */
  end(cookieHeader: string | null): Promise<string>;
  /** Removes the rows of sessions that are over. */
  removeExpired(): Promise<void>;
}

/** `tls`: browsers come over https, so the cookie may carry the `__Host-` prefix and must be Secure. */
export function createSessions(database: Database, options: { tls: boolean }): Sessions {
  const lucia = createLucia(database, options.tls);

  const begin: Sessions['begin'] = async ({ userId, workshopId }) => {
    const createdAt = new Date();
    const endsAt = new Date(createdAt.getTime() + longestSeconds * 1000);
    const session = await lucia.createSession(userId, { workshopId, createdAt, endsAt });
    const cookie = lucia.createSessionCookie(session.id);
    // the server ends idle sessions; the cookie itself need only outlive the longest one
    cookie.attributes.maxAge = longestSeconds;
    return cookie.serialize();
  };

  const readActor: Sessions['readActor'] = async (cookieHeader) => {
    const token = tokenIn(cookieHeader, lucia.sessionCookieName);
    if (token === null) return null;
    const { session, user } = await lucia.validateSession(token);
    if (session === null) return null;
    const membership = await findMembership(database, session.workshopId, user.id);
    if (membership === null) return null;
    return {
      userId: user.id,
      workshopId: session.workshopId,
      name: user.name,
      email: user.email,
      ...membership,
    };
  };

  const end: Sessions['end'] = async (cookieHeader) => {
    const token = tokenIn(cookieHeader, lucia.sessionCookieName);
    if (token !== null) await lucia.invalidateSession(token);
    return lucia.createBlankSessionCookie().serialize();
  };

  return {
    cookieName: lucia.sessionCookieName,
    begin,
    readActor,
    end,
    removeExpired: () => lucia.deleteExpiredSessions(),
  };
}

/** Lucia's own parser throws on a broken escape in any other cookie; ours looks for one name only. */
function tokenIn(header: string | null, name: string): string | null {
  const pair = header?.split(';').find((part) => part.trim().startsWith(`${name}=`));
  const token = pair?.trim().slice(name.length + 1) ?? '';
  return /^[a-z2-7]{32,64}$/.test(token) ? token : null;
}

function createLucia(database: Database, tls: boolean) {
  return new Lucia(luciaAdapter(database), {
    sessionExpiresIn: new TimeSpan(idleDays, 'd'),
    sessionCookie: {
      name: tls ? '__Host-dipwright' : 'dipwright',
      attributes: { secure: tls, sameSite: 'lax', path: '/' },
    },
    getSessionAttributes: ({ workshopId, createdAt, endsAt }) => ({
      workshopId,
      createdAt,
      endsAt,
    }),
    getUserAttributes: ({ name, email }) => ({ name, email }),
  });
}

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof createLucia>;
    DatabaseSessionAttributes: { workshopId: string; createdAt: Date; endsAt: Date };
    DatabaseUserAttributes: { name: string; email: string };
  }
}
