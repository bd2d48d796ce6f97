import { loadManifold } from '../../geometry/manifold';
import { DipwrightError } from '../errors';
import type { TankDocument } from '../tank/document';
import type { PlacedSolid } from '../tank/placed-solid';
import { insideWall, placedSolids } from '../tank/placed-solids';
import type { TankSettings } from '../tank/settings';
import { sizeKey } from '../tank/size-key';
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

/** The wall under outside sizes is plate, not taped: without a ± of its own it has this part of itself at most. */
const shareOfWall = 0.1;

/** How sizes and dips were measured: what the ± of a table comes from. */
export type Measured = Pick<
  TankSettings,
  'sizePlusMinusMm' | 'ownSizePlusMinusMm' | 'dipPlusMinusMm'
>;

/** Half-widths of 95 % intervals, litres. */
export interface PlusMinus {
  /** Of the litres at each row, in the order of the rows: sizes, dip and computing. */
  rowsL: number[];
  /** Of the whole liquid space: sizes and computing. Nobody dips a brim. */
  brimL: number;
}

/**
 * The ± of a table, half-widths of 95 % intervals: first order, independent contributions in quadrature (JCGM
 * 100:2008, 5.1.2, equation 10). They are the ± of every size (its own, or that of all), turned one at a time
 * through the whole computation at fixed readings; the ± of the dip times dV/dreading; the bound of computing.
 * The brim is the whole space whatever the stick reaches, without a dip. Places and angles are taken as exact.
 */
export async function plusMinusOfTable(
  document: TankDocument,
  measured: Measured,
  { rows, heightMm, errorL }: TableWithoutPlusMinus,
): Promise<PlusMinus> {
  await loadManifold();
  const depths = Array.from({ length: samples + 1 }, (_, i) => (i / samples) * heightMm);
  const solids = placedSolids(document);
  const nominal = litresAt(document, solids, depths);
  const sizes = sizesSquared(document, measured, depths, nominal.litres);
  const depthOf = Float64Array.from(depths);

  const { slopeLPerMm } = curveFromRows(rows, nominal.levelPerReading);
  const rowsL = rows.map(({ depthMm }, row) => {
    const i = segmentOf(depthOf, depthMm);
    const t = (depthMm - depths[i]!) / (depths[i + 1]! - depths[i]!);
    const bySizes = sizes[i]! + Math.min(Math.max(t, 0), 1) * (sizes[i + 1]! - sizes[i]!);
    const byDip = measured.dipPlusMinusMm * slopeLPerMm[row]!;
    return Math.sqrt(bySizes + byDip ** 2 + errorL ** 2);
  });
  return { rowsL, brimL: Math.sqrt(sizes[samples + 1]! + errorL ** 2) };
}

/** Sum of the squares of what each size contributes at each depth, and last to the whole space, L². */
function sizesSquared(
  document: TankDocument,
  { sizePlusMinusMm, ownSizePlusMinusMm = {} }: Measured,
  depths: readonly number[],
  nominal: readonly number[],
): number[] {
  const sum = nominal.map(() => 0);
  const wallMm = document.wall?.thickness ?? 0;
  const plusMinusOf = (id: string, path: readonly string[]) => {
    const ofWall = id === 'wall' && path[0] === 'thickness';
    const usual = ofWall ? Math.min(sizePlusMinusMm, shareOfWall * wallMm) : sizePlusMinusMm;
    return ownSizePlusMinusMm[sizeKey(id, path)] ?? usual;
  };
  const larger = sizeVariants(document, plusMinusOf);
  const smaller = sizeVariants(document, (id, path) => -plusMinusOf(id, path));
  larger.forEach(({ sizeMm, byMm, variants, wallMm: wall }, index) => {
    const changes = variants.map(
      (variant, end) =>
        changed(variant, wall) ??
        // a size made larger may contradict another, or leave nothing under the stick: then it is made smaller
        (sizeMm > byMm ? changed(smaller[index]!.variants[end]!, smaller[index]!.wallMm) : null) ??
        nominal.map((litres) => (litres * byMm) / sizeMm),
    );
    sum.forEach((_, i) => (sum[i]! += Math.max(...changes.map((change) => change[i]! ** 2))));
  });
  return sum;

  function changed(variant: readonly PlacedSolid[], wall: number | null): number[] | null {
    if (variant.some(({ kind, solid }) => kind.faults(solid).length > 0)) return null;
    try {
      const { litres } = litresAt(
        document,
        wall === null ? variant : insideWall(variant, wall),
        depths,
      );
      return litres.map((value, i) => value - nominal[i]!);
    } catch (error) {
      if (error instanceof DipwrightError) return null;
      throw error;
    }
  }
}

/** Litres at each depth, and last of the whole space. */
function litresAt(
  document: TankDocument,
  solids: readonly PlacedSolid[],
  depths: readonly number[],
) {
  const space = liquidSpace(solids, facets);
  const frame = readingFrame(document, solids, space);
  const litres = tableRows(space, frame, depths).map(({ volumeL }) => volumeL);
  litres.push(space.volumeMm3 / 1e6);
  return { litres, levelPerReading: frame.levelPerReading };
}
