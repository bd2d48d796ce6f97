import { requirePermission } from '~/domain/access/permissions';
import type { Actor, Context } from '../context';
import { listRevisionHeads } from '../database/repositories/revisions';
import { plusMinusAtTop } from '../database/repositories/tank-overviews';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

/** ± of the litres at the top of every revision of a tank, by revision. */
export async function listBrims(
  context: Context,
  actor: Actor,
  input: { tankId: string },
): Promise<Map<string, number>> {
  requirePermission(actor.role, 'revision.read');
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, input.tankId);
  return plusMinusAtTop(scope, await listRevisionHeads(scope, input.tankId));
}
