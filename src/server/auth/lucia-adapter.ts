import type { Adapter, DatabaseSession } from 'lucia';
import type { Database } from '../database/connect';
import type { SessionRecord } from '../database/models/session';
import {
  findSession,
  insertSession,
  listSessionsOf,
  moveSessionExpiry,
  removeSession,
  removeSessionsOf,
  removeSessionsOverBy,
} from '../database/repositories/sessions';
import { findUser } from '../database/repositories/users';
import { tokenHash } from './token-hash';

/**
 * Lucia's sessions in our own table. Lucia works with the token; the table keeps only its SHA-256,
 * so that whoever reads the database cannot act for anybody.
 */
export function luciaAdapter(database: Database): Adapter {
  return {
    async getSessionAndUser(token) {
      const session = await findSession(database, tokenHash(token));
      if (session === null) return [null, null];
      const user = await findUser(database, session.userId);
      if (user === null) return [asLucia(session, token), null];
      const { id, name, email } = user;
      return [asLucia(session, token), { id, attributes: { name, email } }];
    },
    /** The tokens themselves are not known any more: ids are their hashes. */
    async getUserSessions(userId) {
      const sessions = await listSessionsOf(database, userId);
      return sessions.map((session) => asLucia(session, session.tokenHash));
    },
    async setSession({ id, userId, expiresAt, attributes }) {
      await insertSession(database, { tokenHash: tokenHash(id), userId, expiresAt, ...attributes });
    },
    /** Use moves the end on, but never past the session's own last moment. */
    async updateSessionExpiration(token, expiresAt) {
      const session = await findSession(database, tokenHash(token));
      if (session === null) return;
      const { endsAt } = session;
      await moveSessionExpiry(database, session.tokenHash, expiresAt < endsAt ? expiresAt : endsAt);
    },
    deleteSession: (token) => removeSession(database, tokenHash(token)),
    deleteUserSessions: (userId) => removeSessionsOf(database, userId),
    deleteExpiredSessions: () => removeSessionsOverBy(database, new Date()),
  };
}

function asLucia(session: SessionRecord, id: string): DatabaseSession {
  const { userId, expiresAt, workshopId, createdAt, endsAt } = session;
  return { id, userId, expiresAt, attributes: { workshopId, createdAt, endsAt } };
}
