import { createHash } from 'node:crypto';
import { requirePermission } from '~/domain/access/permissions';
import { DipwrightError, invalid } from '~/domain/errors';
import type { NewReading, Reading } from '~/domain/reading/reading';
import type { Actor, Context } from '../context';
import type { ReadingRecord } from '../database/models/reading';
import { newId } from '../database/new-id';
import { findReadingByKey, insertReading } from '../database/repositories/readings';
import { currentRevision } from '../database/repositories/revisions';
import { listRows } from '../database/repositories/strapping-rows';
import type { Scope } from '../database/scope';
import { canonicalJson } from './canonical-json';
import { askable, lookUpAt } from './look-up';
import { readingsAsSeen } from './readings-as-seen';
import { scopeOf } from './scope-of';
import { tankInSight } from './tank-in-sight';

const dayMs = 24 * 3600 * 1000;

/**
 * Keeps a dip with what it meant by the current revision. A key that this tank already knows gives
 * the answer of the first time; with another reading it is refused, and nothing is stored twice.
 */
export async function recordReading(
  context: Context,
  actor: Actor,
  input: { tankId: string; idempotencyKey: string; reading: NewReading },
): Promise<Reading> {
  requirePermission(actor.role, 'reading.record');
  const { tankId, idempotencyKey, reading } = input;
  const scope = scopeOf(context, actor);
  await tankInSight(scope, actor, tankId);

  const bodyHash = createHash('sha256').update(canonicalJson(reading)).digest('hex');
  const known = await findReadingByKey(scope, tankId, idempotencyKey);
  if (known !== null) return answerAgain(scope, known, bodyHash);

  const takenAt = momentOf(reading.at, context.clock.now());
  const { revisionId, litres } = await meaningOf(scope, tankId, reading.depthMm);
  const record: Omit<ReadingRecord, 'workshopId'> = {
    id: newId(),
    tankId,
    revisionId,
    idempotencyKey,
    bodyHash,
    takenAt,
    depthMm: reading.depthMm,
    volumeL: litres.volumeL,
    usableL: litres.usableL,
    roomL: litres.roomL,
    massKg: litres.massKg,
    plusMinusL: litres.plusMinusL,
    note: reading.note === undefined || reading.note === '' ? null : reading.note,
    recordedBy: actor.userId,
    recordedAt: context.clock.now(),
  };
  if (await insertReading(scope, record)) {
    return answerOf(scope, { ...record, workshopId: actor.workshopId });
  }
  // the same key came in between on another connection: its row is the one that counts
  const first = await findReadingByKey(scope, tankId, idempotencyKey);
  if (first === null) throw new Error('A reading was refused as known, but is not there.');
  return answerAgain(scope, first, bodyHash);
}

async function answerAgain(
  scope: Scope,
  record: ReadingRecord,
  bodyHash: string,
): Promise<Reading> {
  if (record.bodyHash !== bodyHash) {
    throw new DipwrightError(
      'invalid',
      'This Idempotency-Key was used for another reading of this tank: send a new key with a new reading.',
    );
  }
  return answerOf(scope, record);
}

async function answerOf(scope: Scope, record: ReadingRecord): Promise<Reading> {
  const [reading] = await readingsAsSeen(scope, [record]);
  return reading!;
}

async function meaningOf(scope: Scope, tankId: string, depthMm: number) {
  const revision = await currentRevision(scope, tankId);
  if (revision === null) {
    throw new DipwrightError(
      'conflict',
      'This tank has no issued table yet, so a dip has no litres: issue its first revision.',
    );
  }
  const table = askable(revision, true, await listRows(scope, revision.id));
  return { revisionId: revision.id, litres: lookUpAt(table, depthMm) };
}

function momentOf(at: string, now: Date): Date {
  const moment = new Date(at);
  const fits = moment.getTime() >= 0 && moment.getTime() <= now.getTime() + dayMs;
  if (!fits) throw invalid('/at', 'Give the time of the dip: from 1970 on, and not in the future.');
  return moment;
}
