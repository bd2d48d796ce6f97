import { requirePermission } from '~/domain/access/permissions';
import { printedRows } from '~/domain/table/printed-rows';
import type { IssuedRow } from '~/domain/table/request';
import type { RevisionSummary } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import { namesOfUsers } from '../database/repositories/users';
import { revisionInSight } from './revision-in-sight';
import { summaryOf } from './revision-summary';
import { scopeOf } from './scope-of';
import { soundRows } from './sound-rows';

/** The table as issued, its hash checked, without the closer rows between. */
export async function readTable(
  context: Context,
  actor: Actor,
  input: { revisionId: string },
): Promise<{ revision: RevisionSummary; tankName: string; rows: IssuedRow[] }> {
  requirePermission(actor.role, 'revision.read');
  const scope = scopeOf(context, actor);
  const { revision, tank, current } = await revisionInSight(scope, actor, input.revisionId);
  const names = await namesOfUsers(context.database, [revision.issuedBy]);
  const rows = printedRows(await soundRows(scope, revision));
  return { revision: summaryOf(revision, current, names), tankName: tank.name, rows };
}
