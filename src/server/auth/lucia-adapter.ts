import type { Adapter, DatabaseSession } from 'lucia';
import { Op } from 'sequelize';
import type { Database } from '../database/connect';
import type { SessionRecord } from '../database/models/session';
import { tokenHash } from './token-hash';

/**
 * Lucia's sessions in our own table. Lucia works with the token; the table keeps only its SHA-256,
 * so that whoever reads the database cannot act for anybody.
 */
export function luciaAdapter(database: Database): Adapter {
  const { sessions, users } = database.models;
  return {
    async getSessionAndUser(token) {
      const session = await sessions.findByPk(tokenHash(token));
      if (session === null) return [null, null];
      const record = session.get();
      const user = await users.findByPk(record.userId);
      const named = user === null ? null : { id: record.userId, attributes: nameOf(user.get()) };
      return [asLucia(record, token), named];
    },
    /** The tokens themselves are not known any more: ids are their hashes. */
    async getUserSessions(userId) {
      const found = await sessions.findAll({ where: { userId } });
      return found.map((session) => asLucia(session.get(), session.get().tokenHash));
    },
    async setSession({ id, userId, expiresAt, attributes }) {
      const { workshopId, createdAt, endsAt } = attributes;
      await sessions.create({ tokenHash: tokenHash(id), userId, expiresAt, workshopId, createdAt, endsAt });
    },
    /** Use moves the end on, but never past the session's own last moment. */
    async updateSessionExpiration(token, expiresAt) {
      const session = await sessions.findByPk(tokenHash(token));
      if (session === null) return;
      const { endsAt } = session.get();
      await session.update({ expiresAt: expiresAt < endsAt ? expiresAt : endsAt });
    },
    async deleteSession(token) {
      await sessions.destroy({ where: { tokenHash: tokenHash(token) } });
    },
    async deleteUserSessions(userId) {
      await sessions.destroy({ where: { userId } });
    },
    async deleteExpiredSessions() {
      await sessions.destroy({ where: { expiresAt: { [Op.lte]: new Date() } } });
    },
  };
}

function asLucia(record: SessionRecord, id: string): DatabaseSession {
  const { userId, expiresAt, workshopId, createdAt, endsAt } = record;
  return { id, userId, expiresAt, attributes: { workshopId, createdAt, endsAt } };
}

function nameOf({ name, email }: { name: string; email: string }): { name: string; email: string } {
  return { name, email };
}
