import type { KeptRow } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { RevisionRecord } from '../database/models/revision';
import { listRows } from '../database/repositories/strapping-rows';
import type { Scope } from '../database/scope';
import { revisionHash } from './revision-hash';
import { issuedSettings } from './settings-of';

/**
 * The rows of a revision, for paper and downloads: refused when what stands in the database is not
 * what was hashed at issue, since a wrong table must not leave the house.
 */
export async function soundRows(scope: Scope, revision: RevisionRecord): Promise<KeptRow[]> {
  const rows = await listRows(scope, revision.id);
  const design = JSON.parse(revision.design) as TankDocument;
  if (
    revisionHash(design, issuedSettings(revision), rows, revision.brimPlusMinusL) !== revision.hash
  ) {
    throw new Error(`Revision ${revision.id} does not match its hash: restore it from a backup.`);
  }
  return rows;
}
