import type { Actor } from '../../src/domain/access/actor';
import type { Role } from '../../src/domain/access/roles';
import { hashPassword } from '../../src/server/auth/passwords';
import type { Context } from '../../src/server/context';
import { newId } from '../../src/server/database/new-id';
import {
  findMembership,
  insertMembership,
} from '../../src/server/database/repositories/memberships';
import { findUserByEmail, insertUser } from '../../src/server/database/repositories/users';
import { inTransaction } from '../../src/server/database/transaction';

export interface NewMember {
  name: string;
  email: string;
  role: Role;
  password: string;
}

/** A member of that workshop; one whose address is there already is left as they are. */
export async function addMember(
  context: Context,
  workshop: { workshopId: string; workshopName: string },
  { name, email, role, password }: NewMember,
): Promise<Actor> {
  const { database } = context;
  const { workshopId, workshopName } = workshop;
  const known = await findUserByEmail(database, email);
  if (known !== null) {
    const membership = await findMembership(database, workshopId, known.id);
    if (membership === null) throw new Error(`${email} is a member of another workshop.`);
    return { userId: known.id, workshopId, name: known.name, email, ...membership };
  }
  const userId = newId();
  const createdAt = context.clock.now();
  const passwordHash = await hashPassword(password);
  await inTransaction(database, async (transaction) => {
    await insertUser(database, { id: userId, name, email, passwordHash, createdAt }, transaction);
    await insertMembership(database, { workshopId, userId, role, createdAt }, transaction);
  });
  return { userId, workshopId, workshopName, role, name, email };
}
