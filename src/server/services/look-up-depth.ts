import { requirePermission } from '~/domain/access/permissions';
import { depthAt, type Curve } from '~/domain/table/curve';
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
  const asked = askable(revision, current, await listRows(scope, revision.id));
  const { curve } = asked.table;
  const depthMm = depthAt(curve, input.volumeL);
  const { plusMinusL } = lookUpAt(asked, depthMm);
  return {
    depthMm,
    volumeL: input.volumeL,
    plusMinusMm: depthSpread(curve, depthMm, input.volumeL, plusMinusL),
    revision: revision.letter,
    current,
  };
}

/**
 * How far the reading moves when the litres move by their ±, the larger of up and down, mm. Through
 * the curve rather than its slope, which is nothing at the edge of a keel; inside the table.
 */
function depthSpread(curve: Curve, depthMm: number, volumeL: number, plusMinusL: number): number {
  const least = curve.volumeL[0]!;
  const most = curve.volumeL[curve.volumeL.length - 1]!;
  const higher = depthAt(curve, Math.min(volumeL + plusMinusL, most)) - depthMm;
  const lower = depthMm - depthAt(curve, Math.max(volumeL - plusMinusL, least));
  return Math.max(higher, lower);
}
