import { requirePermission } from '~/domain/access/permissions';
import type { TankDocument } from '~/domain/tank/document';
import type { Actor, Context } from '../context';
import { currentRevisions } from '../database/repositories/revisions';
import {
  brimsPlusMinus,
  draftDesigns,
  handedOverAmong,
} from '../database/repositories/tank-overviews';
import { listTankRecords } from '../database/repositories/tanks';
import { scopeOf } from './scope-of';

/** What the workshop home shows of a tank beside its record. */
export interface TankOverview {
  /** The draft, for its silhouette. */
  design: TankDocument | null;
  handedOver: boolean;
  /** ± of the brim of the current revision, litres; null while only a draft stands. */
  brimPlusMinusL: number | null;
}

/** By tank; for members who may read drafts. */
export async function listTankOverviews(
  context: Context,
  actor: Actor,
): Promise<Map<string, TankOverview>> {
  requirePermission(actor.role, 'design.read');
  const scope = scopeOf(context, actor);
  const ids = (await listTankRecords(scope)).map(({ id }) => id);
  const designs = await draftDesigns(scope, ids);
  const handedOver = await handedOverAmong(scope, ids);
  const revisions = await currentRevisions(scope, ids);
  const plusMinus = await brimsPlusMinus(scope, [...revisions.values()]);
  return new Map(
    ids.map((id) => {
      const design = designs.get(id);
      return [
        id,
        {
          design: design === undefined ? null : (JSON.parse(design) as TankDocument),
          handedOver: handedOver.has(id),
          brimPlusMinusL: plusMinus.get(revisions.get(id)?.id ?? '') ?? null,
        },
      ];
    }),
  );
}
