import { createHash } from 'node:crypto';
import type { IssuedRow } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import { canonicalJson } from './canonical-json';

/** SHA-256 of a design, whatever the order its keys came in. */
export function designHash(design: TankDocument): string {
  return sha256(canonicalJson(design));
}

/** What a revision is issued from: the same content and step would give the same table. */
export function contentHash(design: string, settings: TankSettings): string {
  return sha256(`${design}\n${canonicalJson(settings)}\n`);
}

/**
 * The hash of a revision: SHA-256, hex, over lines of UTF-8 that each end with a line feed:
 * `dipwright-revision 1`, the design and the settings as canonical JSON, then one line a row,
 * `depthMm,volumeL,surfaceCm2,plusMinusL`, each number in the shortest form that reads back the same.
 */
export function revisionHash(
  design: TankDocument,
  settings: TankSettings,
  rows: readonly IssuedRow[],
): string {
  const hash = createHash('sha256');
  hash.update(`dipwright-revision 1\n${canonicalJson(design)}\n${canonicalJson(settings)}\n`);
  for (const { depthMm, volumeL, surfaceCm2, plusMinusL } of rows) {
    hash.update(`${depthMm},${volumeL},${surfaceCm2},${plusMinusL}\n`);
  }
  return hash.digest('hex');
}

function sha256(text: string): string {
  return createHash('sha256').update(text, 'utf8').digest('hex');
}
