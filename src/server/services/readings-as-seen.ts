import type { Reading } from '~/domain/reading/reading';
import type { ReadingRecord } from '../database/models/reading';
import { listRevisionHeads } from '../database/repositories/revisions';
import { namesOfUsers } from '../database/repositories/users';
import type { Scope } from '../database/scope';

/** Readings of one tank with the letters and names that they stand for. */
export async function readingsAsSeen(
  scope: Scope,
  records: readonly ReadingRecord[],
): Promise<Reading[]> {
  const [first] = records;
  if (first === undefined) return [];
  const revisions = await listRevisionHeads(scope, first.tankId);
  const letters = new Map(revisions.map(({ id, letter }) => [id, letter]));
  const names = await namesOfUsers(
    scope.database,
    records.map(({ recordedBy }) => recordedBy),
  );
  return records.map((record) => {
    const { id, depthMm, volumeL, usableL, roomL, massKg, plusMinusL, note } = record;
    return {
      id,
      at: record.takenAt.toISOString(),
      depthMm,
      volumeL,
      usableL,
      roomL,
      massKg,
      plusMinusL,
      revision: letters.get(record.revisionId) ?? '',
      note,
      by: names.get(record.recordedBy) ?? '',
    };
  });
}
