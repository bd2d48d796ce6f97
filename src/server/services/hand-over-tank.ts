import type { Handover, NewHandover } from '~/domain/access/handover';
import { requirePermission } from '~/domain/access/permissions';
import { invalid } from '~/domain/errors';
import type { Actor, Context } from '../context';
import { isId } from '../database/new-id';
import { insertHandover } from '../database/repositories/handovers';
import { findMembership } from '../database/repositories/memberships';
import { listHandovers } from './list-handovers';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

/** From now on this owner sees the tank. Handing it over again changes nothing. */
export async function handOverTank(
  context: Context,
  actor: Actor,
  input: { tankId: string } & NewHandover,
): Promise<Handover> {
  requirePermission(actor.role, 'tank.hand-over');
  const { tankId, userId } = input;
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, tankId);
  const membership = isId(userId)
    ? await findMembership(context.database, actor.workshopId, userId)
    : null;
  if (membership?.role !== 'owner') {
    throw invalid(
      '/userId',
      'Choose a member of your workshop who is an owner: the others see every tank.',
    );
  }
  await insertHandover(scope, {
    tankId,
    userId,
    handedOverBy: actor.userId,
    handedOverAt: context.clock.now(),
  });
  const handovers = await listHandovers(context, actor, { tankId });
  return handovers.find((handover) => handover.userId === userId)!;
}
