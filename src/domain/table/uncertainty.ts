import { loadManifold } from '../../geometry/manifold';
import { DipwrightError } from '../errors';
import type { TankDocument } from '../tank/document';
import { placedSolid, type PlacedSolid } from '../tank/placed-solid';
import type { TankSettings } from '../tank/settings';
import { curveFromRows, segmentOf } from './curve';
import { liquidSpace } from './liquid-space';
import { readingFrame } from './reading-frame';
import type { ComputedTable } from './request';
import { sizeVariants } from './size-variants';
import { tableRows } from './table-rows';

/** What the ± is worked out for: the rows of a table and the bound of its computing. */
export type TableWithoutPlusMinus = Pick<ComputedTable, 'rows' | 'heightMm' | 'errorL'>;

/** Facets and readings that sensitivities are taken at: they need two digits, not nine. */
const facets = 48;
const samples = 100;

/**
 * The ± of the litres at each row of a table (half-width of a 95 % interval): first order, independent
 * contributions in quadrature (JCGM 100:2008, 5.1.2, equation 10). They are the ± of every size, turned one at
 * a time through the whole computation at fixed readings; the ± of the dip times dV/dreading; the bound of
 * computing. Places and angles are taken as exact. Litres, in the order of the rows.
 */
export async function plusMinusOfRows(
  document: TankDocument,
  settings: Pick<TankSettings, 'sizePlusMinusMm' | 'dipPlusMinusMm'>,
  { rows, heightMm, errorL }: TableWithoutPlusMinus,
): Promise<number[]> {
  await loadManifold();
  const depths = Array.from({ length: samples + 1 }, (_, i) => (i / samples) * heightMm);
  const solids = document.solids.map(placedSolid);
  const nominal = litresAt(document, solids, depths);
  const sizes = sizesSquared(document, settings.sizePlusMinusMm, depths, nominal.litres);
  const depthOf = Float64Array.from(depths);

  const { slopeLPerMm } = curveFromRows(rows, nominal.levelPerReading);
  return rows.map(({ depthMm }, row) => {
    const i = segmentOf(depthOf, depthMm);
    const t = (depthMm - depths[i]!) / (depths[i + 1]! - depths[i]!);
    const bySizes = sizes[i]! + Math.min(Math.max(t, 0), 1) * (sizes[i + 1]! - sizes[i]!);
    const byDip = settings.dipPlusMinusMm * slopeLPerMm[row]!;
    return Math.sqrt(bySizes + byDip ** 2 + errorL ** 2);
  });
}

/** Sum of the squares of what each size contributes at each depth, L². */
function sizesSquared(
  document: TankDocument,
  plusMinusMm: number,
  depths: readonly number[],
  nominal: readonly number[],
): number[] {
  const sum = nominal.map(() => 0);
  if (plusMinusMm === 0) return sum;
  const larger = sizeVariants(document, plusMinusMm);
  const smaller = sizeVariants(document, -plusMinusMm);
  larger.forEach(({ sizeMm, variants }, index) => {
    const changes = variants.map(
      (variant, end) =>
        changed(variant) ??
        // a size made larger may leave nothing under the stick: then it is made smaller
        (sizeMm > plusMinusMm ? changed(smaller[index]!.variants[end]!) : null) ??
        nominal.map((litres) => (litres * plusMinusMm) / sizeMm),
    );
    sum.forEach((_, i) => (sum[i]! += Math.max(...changes.map((change) => change[i]! ** 2))));
  });
  return sum;

  function changed(variant: readonly PlacedSolid[]): number[] | null {
    try {
      const { litres } = litresAt(document, variant, depths);
      return litres.map((value, i) => value - nominal[i]!);
    } catch (error) {
      if (error instanceof DipwrightError) return null;
      throw error;
    }
  }
}

function litresAt(
  document: TankDocument,
  solids: readonly PlacedSolid[],
  depths: readonly number[],
) {
  const space = liquidSpace(solids, facets);
  const frame = readingFrame(document, solids, space);
  const litres = tableRows(space, frame, depths).map(({ volumeL }) => volumeL);
  return { litres, levelPerReading: frame.levelPerReading };
}
