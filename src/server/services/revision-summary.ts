import type { RevisionSummary } from '~/domain/tank/tank';
import type { RevisionHead } from '../database/repositories/revisions';

/** What lists and answers say of a revision. `names`: people by id. */
export function summaryOf(
  revision: RevisionHead,
  current: boolean,
  names: ReadonlyMap<string, string>,
): RevisionSummary {
  const { id, letter, note, stepMm, heightMm, capacityL, errorL, hash } = revision;
  return {
    id,
    letter,
    issuedAt: revision.issuedAt.toISOString(),
    issuedBy: names.get(revision.issuedBy) ?? '',
    note,
    stepMm,
    heightMm,
    capacityL,
    errorL,
    hash,
    current,
  };
}
