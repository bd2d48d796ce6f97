import { requirePermission } from '~/domain/access/permissions';
import type { Reading } from '~/domain/reading/reading';
import type { Actor, Context } from '../context';
import { listReadingRecords } from '../database/repositories/readings';
import { readingsAsSeen } from './readings-as-seen';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

/** How many are told when nobody says. */
const usual = 100;

/** The last readings of a tank, latest first. */
export async function listReadings(
  context: Context,
  actor: Actor,
  input: { tankId: string; most?: number | undefined },
): Promise<Reading[]> {
  requirePermission(actor.role, 'reading.list');
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, input.tankId);
  return readingsAsSeen(scope, await listReadingRecords(scope, input.tankId, input.most ?? usual));
}
