import { requirePermission } from '~/domain/access/permissions';
import { invalid } from '~/domain/errors';
import { changedSettings, startingSettings } from '~/domain/tank/complete-settings';
import { startingPoints } from '~/domain/tank/starting-points';
import type { TankDocument } from '~/domain/tank/document';
import type { NewTank, Tank } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import { isId, newId } from '../database/new-id';
import { insertDraft } from '../database/repositories/drafts';
import { findInstallation } from '../database/repositories/installations';
import { insertTank } from '../database/repositories/tanks';
import { inTransaction } from '../database/transaction';
import { readTank } from './read-tank';
import { designHash } from './revision-hash';
import { scopeOf } from './scope-of';
import { recordOfSettings } from './settings-of';

/** A new tank and its draft: the design that was sent, or else a plain box to begin from. */
export async function createTank(context: Context, actor: Actor, input: NewTank): Promise<Tank> {
  requirePermission(actor.role, 'tank.create');
  const settings = changedSettings(
    startingSettings(input.liquid),
    input.settings ?? {},
    '/settings',
  );
  const design = input.design ?? plainBox(input.name);
  const tankId = newId();
  const now = context.clock.now();

  await inTransaction(context.database, async (transaction) => {
    const scope = scopeOf(context, actor, transaction);
    const { installationId, name } = input;
    if (!isId(installationId) || (await findInstallation(scope, installationId)) === null) {
      throw invalid('/installationId', 'Choose an installation of your workshop.');
    }
    await insertTank(scope, {
      id: tankId,
      installationId,
      name,
      ...recordOfSettings(settings),
      createdBy: actor.userId,
      createdAt: now,
    });
    await insertDraft(scope, {
      tankId,
      design: JSON.stringify(design),
      designHash: designHash(design),
      version: 1,
      savedBy: actor.userId,
      savedAt: now,
    });
  });
  return readTank(context, actor, { tankId });
}

function plainBox(name: string): TankDocument {
  return { ...startingPoints[0]!.design, name };
}
