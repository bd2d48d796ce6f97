import type { Handover } from '~/domain/access/handover';
import { requirePermission } from '~/domain/access/permissions';
import type { Actor, Context } from '../context';
import { listHandoverRecords } from '../database/repositories/handovers';
import { namesOfUsers } from '../database/repositories/users';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

/** The owners who see this tank, in the order in which it was handed over. */
export async function listHandovers(
  context: Context,
  actor: Actor,
  input: { tankId: string },
): Promise<Handover[]> {
  requirePermission(actor.role, 'tank.hand-over');
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, input.tankId);
  const handovers = await listHandoverRecords(scope, input.tankId);
  const names = await namesOfUsers(
    context.database,
    handovers.flatMap(({ userId, handedOverBy }) => [userId, handedOverBy]),
  );
  return handovers.map(({ userId, handedOverAt, handedOverBy }) => ({
    userId,
    name: names.get(userId) ?? '',
    handedOverAt: handedOverAt.toISOString(),
    handedOverBy: names.get(handedOverBy) ?? '',
  }));
}
