import { createHash } from 'node:crypto';
import type { KeptRow } from '~/domain/table/request';
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
 * `dipwright-revision 2`, the design and the settings as canonical JSON, the ± of the brim in litres, then one line
 * a row, `depthMm,volumeL,surfaceCm2,plusMinusL`, followed by `,between` for a row that only look-ups use; each
 * number in the shortest form that reads back the same. A revision from before has no ± of its brim (null) and no
 * rows between: its first line says 1 and the line of the brim is not there.
 */
export function revisionHash(
  design: TankDocument,
  settings: TankSettings,
  rows: readonly KeptRow[],
  brimPlusMinusL: number | null,
): string {
  const hash = createHash('sha256');
  const form = brimPlusMinusL === null ? 1 : 2;
  hash.update(`dipwright-revision ${form}\n${canonicalJson(design)}\n${canonicalJson(settings)}\n`);
  if (brimPlusMinusL !== null) hash.update(`${brimPlusMinusL}\n`);
  for (const { depthMm, volumeL, surfaceCm2, plusMinusL, betweenRows } of rows) {
    const kind = betweenRows ? ',between' : '';
    hash.update(`${depthMm},${volumeL},${surfaceCm2},${plusMinusL}${kind}\n`);
  }
  return hash.digest('hex');
}

function sha256(text: string): string {
  return createHash('sha256').update(text, 'utf8').digest('hex');
}
