import type { Tank } from '~/domain/tank/tank';
import type { Actor } from '../context';
import type { TankRecord } from '../database/models/tank';
import { designHashes } from '../database/repositories/drafts';
import { listInstallationRecords } from '../database/repositories/installations';
import { currentRevisions } from '../database/repositories/revisions';
import { namesOfUsers } from '../database/repositories/users';
import type { Scope } from '../database/scope';
import { contentHash } from './revision-hash';
import { summaryOf } from './revision-summary';
import { issuedSettings, settingsOf } from './settings-of';

/** Tanks as this actor is told of them: an owner hears of what was issued, never of drafts. */
export async function tanksAsSeen(
  scope: Scope,
  actor: Actor,
  tanks: readonly TankRecord[],
): Promise<Tank[]> {
  const ids = tanks.map(({ id }) => id);
  const installations = await listInstallationRecords(
    scope,
    tanks.map((tank) => tank.installationId),
  );
  const revisions = await currentRevisions(scope, ids);
  const drafts =
    actor.role === 'owner' ? new Map<string, string>() : await designHashes(scope, ids);
  const names = await namesOfUsers(
    scope.database,
    [...revisions.values()].map(({ issuedBy }) => issuedBy),
    scope.transaction,
  );
  const installationNames = new Map(installations.map(({ id, name }) => [id, name]));
  return tanks.map((tank) => {
    const revision = revisions.get(tank.id) ?? null;
    const draft = drafts.get(tank.id);
    const settings = settingsOf(tank);
    return {
      id: tank.id,
      installationId: tank.installationId,
      installationName: installationNames.get(tank.installationId) ?? '',
      name: tank.name,
      settings: actor.role === 'owner' && revision !== null ? issuedSettings(revision) : settings,
      revision: revision === null ? null : summaryOf(revision, true, names),
      draftDiffers: draft !== undefined && contentHash(draft, settings) !== revision?.contentHash,
    };
  });
}
