import type { IssuedRow } from '~/domain/table/request';

/** Issued rows as one short text, so that a page carries a long table without carrying its keys. */
export function packRows(rows: readonly IssuedRow[]): string {
  return JSON.stringify(rows.map((r) => [r.depthMm, r.volumeL, r.surfaceCm2, r.plusMinusL]));
}

export function unpackRows(packed: string): IssuedRow[] {
  const rows = JSON.parse(packed) as [number, number, number, number][];
  return rows.map(([depthMm, volumeL, surfaceCm2, plusMinusL]) => ({
    depthMm,
    volumeL,
    surfaceCm2,
    plusMinusL,
  }));
}
