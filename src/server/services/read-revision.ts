import { requirePermission } from '~/domain/access/permissions';
import type { RevisionSummary } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import { namesOfUsers } from '../database/repositories/users';
import { revisionInSight } from './revision-in-sight';
import { summaryOf } from './revision-summary';
import { scopeOf } from './scope-of';

export async function readRevision(
  context: Context,
  actor: Actor,
  input: { revisionId: string },
): Promise<RevisionSummary> {
  requirePermission(actor.role, 'revision.read');
  const { revision, current } = await revisionInSight(
    scopeOf(context, actor),
    actor,
    input.revisionId,
  );
  return summaryOf(revision, current, await namesOfUsers(context.database, [revision.issuedBy]));
}
