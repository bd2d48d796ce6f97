import { requirePermission } from '~/domain/access/permissions';
import type { Actor, Context } from '../context';
import { listRevisionHeads } from '../database/repositories/revisions';
import { brimsPlusMinus } from '../database/repositories/tank-overviews';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

/** ± of the brim of every revision of a tank, litres, by revision. */
export async function listBrims(
  context: Context,
  actor: Actor,
  input: { tankId: string },
): Promise<Map<string, number>> {
  requirePermission(actor.role, 'revision.read');
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, input.tankId);
  return brimsPlusMinus(scope, await listRevisionHeads(scope, input.tankId));
}
