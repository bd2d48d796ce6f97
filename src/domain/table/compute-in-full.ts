import { loadManifold } from '../../geometry/manifold';
import { roundingOfCapacity } from '../../geometry/tolerance';
import type { TankDocument } from '../tank/document';
import { placedSolids } from '../tank/placed-solids';
import { liquidSpace, type LiquidSpace } from './liquid-space';
import { openings } from './openings';
import type { ReadingFrame } from './preview';
import { doubledFacets, publishedFacets } from './published-facets';
import { readingFrame } from './reading-frame';
import { readingsOf } from './readings';
import { refuseUncomputable } from './refuse-uncomputable';
import type { ComputedTable, Readings, TableRow } from './request';
import { tableRows } from './table-rows';

/** Part of the capacity that the bound should not pass: beyond it the facets are doubled once more, where time allows. */
const wantedBound = 1e-6;

/** A computed table with the space that it came from. */
export interface FullTable {
  table: ComputedTable;
  space: LiquidSpace;
  frame: ReadingFrame;
}

/** computeTable, for whoever needs more than is printed: the same rows, the same bound, the same faults. */
export async function computeInFull(
  document: TankDocument,
  readings: Readings,
): Promise<FullTable> {
  refuseUncomputable(document);
  await loadManifold();
  const solids = placedSolids(document);
  const facets = publishedFacets(solids);
  const curved = solids.some(({ kind, solid }) => kind.curved(solid));

  let found = at(facets);
  let errorL = (roundingOfCapacity * found.space.volumeMm3) / 1e6;
  if (curved) {
    errorL = Math.max(errorL, greatestMissL(found, liquidSpace(solids, facets / 2)));
    const doubled = doubledFacets(solids, facets);
    // the tank decides: one more doubling takes the bound down by eight
    if (errorL > (wantedBound * found.space.volumeMm3) / 1e6 && doubled !== null) {
      const finer = at(doubled);
      errorL = greatestMissL(finer, found.space);
      found = finer;
    }
  }
  const { space, frame, rows } = found;
  const { undrainableL, trappedL } = openings(document, solids, space, frame.up);
  const table = {
    capacityL: space.volumeMm3 / 1e6,
    heightMm: frame.heightMm,
    errorL,
    triangles: space.mesh.triangles.length / 3,
    undrainableL,
    trappedL,
    rows,
  };
  return { table, space, frame };

  function at(facetsATurn: number): Computed {
    const space = liquidSpace(solids, facetsATurn);
    const frame = readingFrame(document, solids, space);
    const depths = readingsOf(readings, frame.heightMm);
    return { space, frame, depths, rows: tableRows(space, frame, depths) };
  }
}

interface Computed {
  space: LiquidSpace;
  frame: ReadingFrame;
  depths: readonly number[];
  rows: TableRow[];
}

/** The greatest |V₂ₙ − Vₙ| over the rows and over 200 levels between, litres. */
function greatestMissL({ space, frame, depths, rows }: Computed, coarse: LiquidSpace): number {
  const between = Array.from({ length: 201 }, (_, i) => (i / 200) * frame.heightMm);
  const fine = [...rows, ...tableRows(space, frame, between)];
  const rough = tableRows(coarse, frame, [...depths, ...between]);
  return rough.reduce(
    (most, { volumeL }, i) => Math.max(most, Math.abs(fine[i]!.volumeL - volumeL)),
    Math.abs(space.volumeMm3 - coarse.volumeMm3) / 1e6,
  );
}
