import { requirePermission } from '~/domain/access/permissions';
import type { Installation } from '~/domain/installation/installation';
import type { Actor, Context } from '../context';
import { tankIdsHandedOverTo } from '../database/repositories/handovers';
import { listInstallationRecords } from '../database/repositories/installations';
import { listTankRecords } from '../database/repositories/tanks';
import { scopeOf } from './scope-of';

/** All of the workshop's; for an owner those that hold a tank handed over to them. */
export async function listInstallations(context: Context, actor: Actor): Promise<Installation[]> {
  requirePermission(actor.role, 'installation.list');
  const scope = scopeOf(context, actor);
  if (actor.role !== 'owner') return listInstallationRecords(scope);
  const tanks = await listTankRecords(scope, await tankIdsHandedOverTo(scope, actor.userId));
  return listInstallationRecords(
    scope,
    tanks.map(({ installationId }) => installationId),
  );
}
