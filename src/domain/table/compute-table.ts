import { loadManifold } from '../../geometry/manifold';
import { roundingOfCapacity } from '../../geometry/tolerance';
import type { TankDocument } from '../tank/document';
import { placedSolid } from '../tank/placed-solid';
import { liquidSpace } from './liquid-space';
import { openings } from './openings';
import { publishedFacets } from './published-facets';
import { readingFrame } from './reading-frame';
import { readingsOf } from './readings';
import { refuseUncomputable } from './refuse-uncomputable';
import type { ComputedTable, Readings } from './request';
import { tableRows } from './table-rows';

/**
 * The strapping table of a design: published at 2N facets a turn, `errorL` the greatest |V₂ₙ − Vₙ| over its
 * rows and over 200 levels between, and never less than rounding (1e-9 of capacity). Error about 1e-8 of
 * capacity at N = 256. Litres, mm, cm². Throws `invalid` with JSON pointers for what cannot be computed.
 */
export async function computeTable(
  document: TankDocument,
  readings: Readings,
): Promise<ComputedTable> {
  refuseUncomputable(document);
  await loadManifold();
  const solids = document.solids.map(placedSolid);
  const facets = publishedFacets(solids) / 2;
  const fine = liquidSpace(solids, 2 * facets);
  const frame = readingFrame(document, solids, fine);
  const depths = readingsOf(readings, frame.heightMm);
  const rows = tableRows(fine, frame, depths);
  const { undrainableL, trappedL } = openings(document, solids, fine, frame.up);

  let errorL = (roundingOfCapacity * fine.volumeMm3) / 1e6;
  if (solids.some(({ kind, solid }) => kind.curved(solid))) {
    const coarse = liquidSpace(solids, facets);
    const between = Array.from({ length: 201 }, (_, i) => (i / 200) * frame.heightMm);
    const checked = [...depths, ...between];
    const fineRows = [...rows, ...tableRows(fine, frame, between)];
    tableRows(coarse, frame, checked).forEach(({ volumeL }, i) => {
      errorL = Math.max(errorL, Math.abs(fineRows[i]!.volumeL - volumeL));
    });
    errorL = Math.max(errorL, Math.abs(fine.volumeMm3 - coarse.volumeMm3) / 1e6);
  }
  return {
    capacityL: fine.volumeMm3 / 1e6,
    heightMm: frame.heightMm,
    errorL,
    triangles: fine.mesh.triangles.length / 3,
    undrainableL,
    trappedL,
    rows,
  };
}
