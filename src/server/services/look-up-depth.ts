import { requirePermission } from '~/domain/access/permissions';
import { depthAt } from '~/domain/table/curve';
import type { DepthAnswer } from '~/domain/table/depth-answer';
import type { Actor, Context } from '../context';
import { listRows } from '../database/repositories/strapping-rows';
import { askable, lookUpAt } from './look-up';
import { revisionInSight } from './revision-in-sight';
import { scopeOf } from './scope-of';

/** The reading at which so many litres stand. */
export async function lookUpDepth(
  context: Context,
  actor: Actor,
  input: { revisionId: string; volumeL: number },
): Promise<DepthAnswer> {
  requirePermission(actor.role, 'revision.read');
  const scope = scopeOf(context, actor);
  const { revision, current } = await revisionInSight(scope, actor, input.revisionId);
  const table = askable(revision, current, await listRows(scope, revision.id));
  const depthMm = depthAt(table.curve, input.volumeL);
  const { surfaceCm2, plusMinusL } = lookUpAt(table, depthMm);
  // dV/dreading: 1 cm² × 1 mm = 1e-4 L
  const litresPerMm = surfaceCm2 * 1e-4 * revision.levelPerReading;
  return {
    depthMm,
    volumeL: input.volumeL,
    // where the surface has no width, no ± of litres says anything of the depth
    plusMinusMm: litresPerMm > 0 ? plusMinusL / litresPerMm : null,
    revision: revision.letter,
    current,
  };
}
