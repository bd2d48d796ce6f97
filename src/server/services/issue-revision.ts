import { requirePermission } from '~/domain/access/permissions';
import { DipwrightError, invalid, notFound } from '~/domain/errors';
import type { IssuedTable } from '~/domain/table/issued-table';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import { revisionLetter } from '~/domain/tank/revision-letter';
import type { NewRevision, RevisionSummary } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import type { RevisionRecord } from '../database/models/revision';
import { newId } from '../database/new-id';
import { findDraft } from '../database/repositories/drafts';
import { currentRevision, insertRevision } from '../database/repositories/revisions';
import { insertRows } from '../database/repositories/strapping-rows';
import type { Scope } from '../database/scope';
import { inTransaction } from '../database/transaction';
import { levelPerReading } from './level-per-reading';
import { meshFilesOf } from './mesh-files';
import { contentHash, designHash, revisionHash } from './revision-hash';
import { summaryOf } from './revision-summary';
import { scopeOf } from './scope-of';
import { settingsOf } from './settings-of';
import { tankInSight } from './tank-in-sight';

/**
 * Freezes the draft and the settings with the table computed from them, under the next letter.
 * Computes outside the transaction; inside it everything is written, or nothing. Refused when the
 * shape may not be issued, when nothing changed, and when the draft moved on meanwhile.
 */
export async function issueRevision(
  context: Context,
  actor: Actor,
  input: { tankId: string } & NewRevision,
): Promise<RevisionSummary> {
  requirePermission(actor.role, 'revision.issue');
  const { tankId, stepMm } = input;
  const before = await contentOf(scopeOf(context, actor), actor, tankId, stepMm);
  const meshes = await meshFilesOf(context, scopeOf(context, actor), before.design);
  const issued = await context.computePool.issue(before.design, before.settings, stepMm, meshes);
  const frozen = freeze(before, issued);

  const revision = await inTransaction(context.database, async (transaction) => {
    const scope = scopeOf(context, actor, transaction);
    const now = await contentOf(scope, actor, tankId, stepMm, { lock: true });
    if (now.contentHash !== before.contentHash) {
      throw new DipwrightError(
        'conflict',
        'The draft or the settings were changed while the table was computed. Look at them and issue again.',
      );
    }
    const record: Omit<RevisionRecord, 'workshopId'> = {
      ...frozen,
      id: newId(),
      tankId,
      number: now.nextNumber,
      letter: revisionLetter(now.nextNumber),
      contentHash: now.contentHash,
      stepMm,
      note: input.note === undefined || input.note === '' ? null : input.note,
      issuedBy: actor.userId,
      issuedAt: context.clock.now(),
    };
    await insertRevision(scope, record);
    await insertRows(scope, record.id, issued.rows);
    return { ...record, workshopId: actor.workshopId };
  });
  return summaryOf(revision, true, new Map([[actor.userId, actor.name]]));
}

interface Content {
  design: TankDocument;
  settings: TankSettings;
  contentHash: string;
  nextNumber: number;
}

/** What would be issued now; throws when it already is. `lock`: nobody else issues meanwhile. */
async function contentOf(
  scope: Scope,
  actor: Actor,
  tankId: string,
  stepMm: number,
  options: { lock?: boolean } = {},
): Promise<Content> {
  const settings = settingsOf(await tankInSight(scope, actor, tankId, options));
  const draft = await findDraft(scope, tankId);
  if (draft === null) throw notFound('draft');
  const design = JSON.parse(draft.design) as TankDocument;
  const hash = contentHash(designHash(design), settings);
  const latest = await currentRevision(scope, tankId);
  if (latest?.contentHash === hash && latest.stepMm === stepMm) {
    throw new DipwrightError(
      'conflict',
      `Nothing has changed since revision ${latest.letter}: shape, settings and step are the same.`,
    );
  }
  return { design, settings, contentHash: hash, nextNumber: (latest?.number ?? 0) + 1 };
}

function freeze({ design, settings }: Content, { table, rows, brimPlusMinusL }: IssuedTable) {
  const { heightMm } = table;
  refuseOutletAbove(settings, heightMm);
  return {
    design: JSON.stringify(design),
    settings: JSON.stringify(settings),
    heightMm,
    levelPerReading: levelPerReading(design),
    capacityL: table.capacityL,
    errorL: table.errorL,
    rowCount: rows.length,
    brimPlusMinusL,
    hash: revisionHash(design, settings, rows, brimPlusMinusL),
  };
}

function refuseOutletAbove({ outletMm }: TankSettings, heightMm: number): void {
  if (outletMm === null || outletMm <= heightMm) return;
  throw invalid(
    '/settings/outletMm',
    `The outlet stands at ${outletMm} mm, above the highest reading of ${Math.round(heightMm * 10) / 10} mm: correct one of them.`,
  );
}
