import { requirePermission } from '~/domain/access/permissions';
import type { KeptRow } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import type { Actor, Context } from '../context';
import { currentRevision, findRevision } from '../database/repositories/revisions';
import { scopeOf } from './scope-of';
import { issuedSettings } from './settings-of';
import { soundRows } from './sound-rows';
import { tankInSight } from './tank-in-sight';

/** The revision in force, as whoever dips the tank needs it: its rows and all that was frozen with them. */
export interface TankCard {
  /** Closer rows included: the card's own arithmetic interpolates between them. */
  rows: KeptRow[];
  design: TankDocument;
  settings: TankSettings;
  /** dLevel/dReading: 1 unless a tank with a stick stands tilted. */
  levelPerReading: number;
  /** ± of the brim, litres; of a revision that did not freeze it, the ± of its last row. */
  brimPlusMinusL: number;
}

/** null while the tank has only a draft. */
export async function readTankCard(
  context: Context,
  actor: Actor,
  input: { tankId: string },
): Promise<TankCard | null> {
  requirePermission(actor.role, 'revision.read');
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, input.tankId);
  const head = await currentRevision(scope, input.tankId);
  const revision = head === null ? null : await findRevision(scope, head.id);
  if (revision === null) return null;
  const rows = await soundRows(scope, revision);
  return {
    rows,
    design: JSON.parse(revision.design) as TankDocument,
    settings: issuedSettings(revision),
    levelPerReading: revision.levelPerReading,
    brimPlusMinusL: revision.brimPlusMinusL ?? rows.at(-1)?.plusMinusL ?? revision.errorL,
  };
}
