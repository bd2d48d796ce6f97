import { requirePermission } from '~/domain/access/permissions';
import { invalid } from '~/domain/errors';
import type { LookUp } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import { listRows } from '../database/repositories/strapping-rows';
import { askable, lookUpAt } from './look-up';
import { revisionInSight } from './revision-in-sight';
import { scopeOf } from './scope-of';

/**
 * Litres from a dip (`depthMm`, from the zero of the stick) or from the space above the liquid
 * (`ullageMm`, down from the top of the stick's range).
 */
export async function lookUpVolume(
  context: Context,
  actor: Actor,
  input: { revisionId: string } & ({ depthMm: number } | { ullageMm: number }),
): Promise<LookUp> {
  requirePermission(actor.role, 'revision.read');
  const scope = scopeOf(context, actor);
  const { revision, current } = await revisionInSight(scope, actor, input.revisionId);
  const { heightMm } = revision;
  if ('ullageMm' in input && !(input.ullageMm >= 0 && input.ullageMm <= heightMm)) {
    const most = Math.round(heightMm * 10) / 10;
    throw invalid(
      '/ullageMm',
      `Give a space above the liquid from 0 to ${most} mm: the stick ends there.`,
    );
  }
  const depthMm = 'depthMm' in input ? input.depthMm : heightMm - input.ullageMm;
  return lookUpAt(askable(revision, current, await listRows(scope, revision.id)), depthMm);
}
