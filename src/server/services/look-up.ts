import { answerAt, onTheLineAt, type DipTable } from '~/domain/table/answer-at';
import { curveFromRows } from '~/domain/table/curve';
import type { IssuedRow } from '~/domain/table/request';
import type { LookUp } from '~/domain/tank/tank';
import type { RevisionHead } from '../database/repositories/revisions';
import { issuedSettings } from './settings-of';

/** A revision's table, ready to be asked. */
export interface AskableTable {
  revision: RevisionHead;
  current: boolean;
  table: DipTable;
  surfaceCm2: readonly number[];
}

export function askable(
  revision: RevisionHead,
  current: boolean,
  rows: readonly IssuedRow[],
): AskableTable {
  const { heightMm, capacityL, levelPerReading } = revision;
  const table = {
    curve: curveFromRows(rows, levelPerReading),
    plusMinusL: rows.map(({ plusMinusL }) => plusMinusL),
    heightMm,
    capacityL,
    settings: issuedSettings(revision),
  };
  return { revision, current, table, surfaceCm2: rows.map(({ surfaceCm2 }) => surfaceCm2) };
}

/**
 * What a reading means by the settings frozen with the revision. `depthMm` lies along the stick from
 * its zero; outside 0…heightMm it throws `invalid`.
 */
export function lookUpAt(
  { revision, current, table, surfaceCm2 }: AskableTable,
  depthMm: number,
): LookUp {
  const { aboveSafeFillL: _above, ...figures } = answerAt(table, depthMm);
  if (!Number.isFinite(figures.massKg)) {
    throw new Error(`Revision ${revision.id} froze no density.`);
  }
  return {
    ...figures,
    surfaceCm2: onTheLineAt(table.curve, surfaceCm2, depthMm),
    revision: revision.letter,
    current,
  };
}
