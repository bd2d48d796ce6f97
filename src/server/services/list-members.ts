import type { Member } from '~/domain/access/member';
import { requirePermission } from '~/domain/access/permissions';
import type { Actor, Context } from '../context';
import { listMemberships } from '../database/repositories/memberships';
import { scopeOf } from './scope-of';

export async function listMembers(context: Context, actor: Actor): Promise<Member[]> {
  requirePermission(actor.role, 'member.list');
  const members = await listMemberships(scopeOf(context, actor));
  return members.map(({ userId, name, role }) => ({ id: userId, name, role }));
}
