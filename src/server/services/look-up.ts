import { liquids } from '~/domain/liquid/liquids';
import { curveFromRows, segmentOf, volumeAt, type Curve } from '~/domain/table/curve';
import type { IssuedRow } from '~/domain/table/request';
import type { LookUp } from '~/domain/tank/tank';
import type { RevisionHead } from '../database/repositories/revisions';
import { issuedSettings } from './settings-of';

/** A revision's table, ready to be asked. */
export interface AskableTable {
  revision: RevisionHead;
  current: boolean;
  rows: readonly IssuedRow[];
  curve: Curve;
}

export function askable(
  revision: RevisionHead,
  current: boolean,
  rows: readonly IssuedRow[],
): AskableTable {
  return { revision, current, rows, curve: curveFromRows(rows, revision.levelPerReading) };
}

/**
 * What a reading means by the settings frozen with the revision. `depthMm` lies along the stick from its
 * zero; outside 0…heightMm it throws `invalid`. Litres by the curve through the rows, ± and free
 * surface on the straight line between them.
 */
export function lookUpAt(table: AskableTable, depthMm: number): LookUp {
  const { revision, current, rows, curve } = table;
  const settings = issuedSettings(revision);
  const volumeL = volumeAt(curve, depthMm);
  const densityKgPerM3 = settings.densityKgPerM3 ?? liquids[settings.liquid].densityKgPerM3;
  if (densityKgPerM3 === null) throw new Error(`Revision ${revision.id} froze no density.`);
  return {
    depthMm,
    ullageMm: revision.heightMm - depthMm,
    volumeL,
    usableL: Math.max(0, volumeL - revision.unusableL),
    roomL: Math.max(0, (revision.capacityL * settings.safeFillPercent) / 100 - volumeL),
    massKg: (volumeL * densityKgPerM3) / 1000,
    plusMinusL: between(rows, curve, depthMm, (row) => row.plusMinusL),
    surfaceCm2: between(rows, curve, depthMm, (row) => row.surfaceCm2),
    revision: revision.letter,
    current,
  };
}

function between(
  rows: readonly IssuedRow[],
  curve: Curve,
  depthMm: number,
  valueOf: (row: IssuedRow) => number,
): number {
  const i = segmentOf(curve.depthMm, depthMm);
  const low = rows[i]!;
  const high = rows[i + 1] ?? low;
  const span = high.depthMm - low.depthMm;
  const share = span === 0 ? 0 : (depthMm - low.depthMm) / span;
  return valueOf(low) + (valueOf(high) - valueOf(low)) * share;
}
