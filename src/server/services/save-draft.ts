import { requirePermission } from '~/domain/access/permissions';
import { DipwrightError, notFound } from '~/domain/errors';
import type { TankDocument } from '~/domain/tank/document';
import type { Actor, Context } from '../context';
import { findDraft, replaceDraft } from '../database/repositories/drafts';
import { namesOfUsers } from '../database/repositories/users';
import type { Scope } from '../database/scope';
import { draftEtag } from './draft-etag';
import type { Draft } from './read-draft';
import { designHash } from './revision-hash';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

/**
 * Saves the draft over the version that was read (`etags`: what If-Match named). When somebody
 * saved in between, nothing is kept and the answer (`precondition-failed`) holds what they saved.
 */
export async function saveDraft(
  context: Context,
  actor: Actor,
  input: { tankId: string; etags: readonly string[]; design: TankDocument },
): Promise<Draft> {
  requirePermission(actor.role, 'design.save');
  const { tankId, design } = input;
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, tankId);
  const before = await findDraft(scope, tankId);
  if (before === null) throw notFound('draft');
  if (!input.etags.includes(draftEtag(before.version))) throw await savedFirst(scope, tankId);
  const saved = await replaceDraft(scope, tankId, before.version, {
    design: JSON.stringify(design),
    designHash: designHash(design),
    savedBy: actor.userId,
    savedAt: context.clock.now(),
  });
  if (!saved) throw await savedFirst(scope, tankId);
  return { design, version: before.version + 1 };
}

async function savedFirst(scope: Scope, tankId: string): Promise<DipwrightError> {
  const current = await findDraft(scope, tankId);
  if (current === null) return notFound('draft');
  const names = await namesOfUsers(scope.database, [current.savedBy]);
  const savedBy = names.get(current.savedBy) ?? '';
  return new DipwrightError(
    'precondition-failed',
    `${savedBy} saved this draft after you read it. Nothing of yours was written over it: compare the two and save again.`,
    {
      facts: {
        etag: draftEtag(current.version),
        savedBy,
        savedAt: current.savedAt.toISOString(),
        design: JSON.parse(current.design),
      },
    },
  );
}
