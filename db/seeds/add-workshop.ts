import type { Actor } from '../../src/domain/access/actor';
import type { Role } from '../../src/domain/access/roles';
import type { Context } from '../../src/server/context';
import { findFirstMembership } from '../../src/server/database/repositories/memberships';
import { findUserByEmail } from '../../src/server/database/repositories/users';
import { signUp } from '../../src/server/services/sign-up';
import { addMember } from './add-member';

export type Team = Record<Role, Actor>;

/** A workshop with one member of every role; what is there already is left as it is. */
export async function addWorkshop(
  context: Context,
  workshop: {
    name: string;
    password: string;
    people: Record<Role, { name: string; email: string }>;
  },
): Promise<Team> {
  const { password, people } = workshop;
  const place = { workshopId: await workshopOf(context, workshop), workshopName: workshop.name };
  const add = (role: Role): Promise<Actor> =>
    addMember(context, place, { ...people[role], role, password });
  return {
    manager: await add('manager'),
    designer: await add('designer'),
    fitter: await add('fitter'),
    owner: await add('owner'),
  };
}

/** The workshop of its manager: found by their address, or opened by them. */
async function workshopOf(
  context: Context,
  { name, password, people }: Parameters<typeof addWorkshop>[1],
): Promise<string> {
  const { email } = people.manager;
  const manager = await findUserByEmail(context.database, email);
  if (manager !== null) {
    const membership = await findFirstMembership(context.database, manager.id);
    if (membership !== null) return membership.workshopId;
  }
  const input = { workshopName: name, name: people.manager.name, email, password };
  const { workshopId, setCookie } = await signUp(context, null, input);
  // nobody holds this session
  await context.sessions.end(setCookie.split(';')[0] ?? null);
  return workshopId;
}
