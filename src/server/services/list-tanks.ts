import { requirePermission } from '~/domain/access/permissions';
import type { Tank } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import { tankIdsHandedOverTo } from '../database/repositories/handovers';
import { listTankRecords } from '../database/repositories/tanks';
import { scopeOf } from './scope-of';
import { tanksAsSeen } from './tanks-as-seen';

/** All of the workshop's tanks; for an owner those handed over to them. */
export async function listTanks(context: Context, actor: Actor): Promise<Tank[]> {
  requirePermission(actor.role, 'tank.list');
  const scope = scopeOf(context, actor);
  const only = actor.role === 'owner' ? await tankIdsHandedOverTo(scope, actor.userId) : undefined;
  return tanksAsSeen(scope, actor, await listTankRecords(scope, only));
}
