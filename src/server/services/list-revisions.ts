import { requirePermission } from '~/domain/access/permissions';
import type { RevisionSummary } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import { listRevisionHeads } from '../database/repositories/revisions';
import { namesOfUsers } from '../database/repositories/users';
import { summaryOf } from './revision-summary';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

/** Every revision of a tank, the current one first. */
export async function listRevisions(
  context: Context,
  actor: Actor,
  input: { tankId: string },
): Promise<RevisionSummary[]> {
  requirePermission(actor.role, 'revision.read');
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, input.tankId);
  const revisions = await listRevisionHeads(scope, input.tankId);
  const names = await namesOfUsers(
    context.database,
    revisions.map(({ issuedBy }) => issuedBy),
  );
  return revisions.map((revision, index) => summaryOf(revision, index === 0, names));
}
