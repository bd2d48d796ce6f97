import type { Transaction } from 'sequelize';
import type { Role } from '~/domain/access/roles';
import type { Database } from '../connect';
import type { MembershipRecord } from '../models/membership';
import type { Scope } from '../scope';

export async function insertMembership(
  database: Database,
  membership: MembershipRecord,
  transaction?: Transaction,
): Promise<void> {
  await database.models.memberships.create(membership, { transaction });
}

/** Role in that workshop, and the workshop's name; null when the person is no member. */
export async function findMembership(
  database: Database,
  workshopId: string,
  userId: string,
): Promise<{ role: Role; workshopName: string } | null> {
  const membership = await database.models.memberships.findOne({ where: { workshopId, userId } });
  const workshop = await database.models.workshops.findByPk(workshopId);
  if (membership === null || workshop === null) return null;
  return { role: membership.get().role, workshopName: workshop.get().name };
}

/** The workshop in which somebody signs in: the first that took them in. */
export async function findFirstMembership(
  database: Database,
  userId: string,
): Promise<MembershipRecord | null> {
  const found = await database.models.memberships.findOne({
    where: { userId },
    order: [
      ['createdAt', 'ASC'],
      ['workshopId', 'ASC'],
    ],
  });
  return found?.get() ?? null;
}

/** Members of the workshop with their names, by name. */
export async function listMemberships(
  scope: Scope,
): Promise<{ userId: string; name: string; role: Role }[]> {
  const { memberships, users } = scope.database.models;
  const found = await memberships.findAll({ where: { workshopId: scope.workshopId } });
  const records = found.map((membership) => membership.get());
  const people = await users.findAll({ where: { id: records.map(({ userId }) => userId) } });
  const names = new Map(people.map((person) => [person.get().id, person.get().name]));
  return records
    .map(({ userId, role }) => ({ userId, role, name: names.get(userId) ?? '' }))
    .sort((a, b) => a.name.localeCompare(b.name));
}
