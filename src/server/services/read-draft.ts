import { requirePermission } from '~/domain/access/permissions';
import { notFound } from '~/domain/errors';
import type { TankDocument } from '~/domain/tank/document';
import type { Actor, Context } from '../context';
import { findDraft } from '../database/repositories/drafts';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

export interface Draft {
  design: TankDocument;
  /** Rises with every save: what a save must name to replace it. */
  version: number;
}

/** The draft of a tank, as it was saved last. */
export async function readDraft(
  context: Context,
  actor: Actor,
  input: { tankId: string },
): Promise<Draft> {
  requirePermission(actor.role, 'design.read');
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, input.tankId);
  const draft = await findDraft(scope, input.tankId);
  if (draft === null) throw notFound('draft');
  return { design: JSON.parse(draft.design) as TankDocument, version: draft.version };
}
