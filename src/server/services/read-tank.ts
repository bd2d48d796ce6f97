import { requirePermission } from '~/domain/access/permissions';
import type { Tank } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';
import { tanksAsSeen } from './tanks-as-seen';

export async function readTank(
  context: Context,
  actor: Actor,
  input: { tankId: string },
): Promise<Tank> {
  requirePermission(actor.role, 'tank.read');
  const scope = scopeOf(context, actor);
  const tank = await tankInSight(scope, actor, input.tankId);
  const [seen] = await tanksAsSeen(scope, actor, [tank]);
  return seen!;
}
