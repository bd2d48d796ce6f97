import { notFound } from '~/domain/errors';
import type { Actor } from '../context';
import type { RevisionRecord } from '../database/models/revision';
import type { TankRecord } from '../database/models/tank';
import { isId } from '../database/new-id';
import { isHandedOver } from '../database/repositories/handovers';
import { currentRevision, findRevision } from '../database/repositories/revisions';
import { findTank } from '../database/repositories/tanks';
import type { Scope } from '../database/scope';

export interface RevisionInSight {
  revision: RevisionRecord;
  tank: TankRecord;
  /** No later letter stands. */
  current: boolean;
}

/** A revision of a tank that the actor may see; anything else is "not found". */
export async function revisionInSight(
  scope: Scope,
  actor: Actor,
  id: string,
): Promise<RevisionInSight> {
  const revision = isId(id) ? await findRevision(scope, id) : null;
  if (revision === null) throw notFound('revision');
  if (actor.role === 'owner' && !(await isHandedOver(scope, revision.tankId, actor.userId))) {
    throw notFound('revision');
  }
  const tank = await findTank(scope, revision.tankId);
  if (tank === null) throw notFound('revision');
  const latest = await currentRevision(scope, revision.tankId);
  return { revision, tank, current: latest?.id === revision.id };
}
