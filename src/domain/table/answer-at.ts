import { liquids } from '../liquid/liquids';
import type { TankSettings } from '../tank/settings';
import { depthAt, segmentOf, volumeAt, type Curve } from './curve';

/** What an issued revision says, as far as a look-up needs it. */
export interface DipTable {
  /** Litres by reading, from the issued rows. */
  curve: Curve;
  /** ± of the litres at each row, litres. */
  plusMinusL: ArrayLike<number>;
  /** Highest reading, mm. */
  heightMm: number;
  /** The whole liquid space, litres. */
  capacityL: number;
  /** As frozen into the revision. */
  settings: TankSettings;
}

/** Every figure of one reading. Litres and kilograms; none of them shares a label with another. */
export interface Answer {
  depthMm: number;
  ullageMm: number;
  volumeL: number;
  usableL: number;
  roomL: number;
  /** By how much the liquid stands above safe fill; 0 below it. */
  aboveSafeFillL: number;
  massKg: number;
  plusMinusL: number;
}

/**
 * Litres, usable, room and kilograms at a reading along the stick, mm from its zero. Usable leaves
 * out what stands below the outlet; room is counted to safe fill, never to the brim; the ± is
 * linear between rows. Throws `invalid` outside 0…heightMm: such a reading is asked back.
 */
export function answerAt(table: DipTable, depthMm: number): Answer {
  const volumeL = volumeAt(table.curve, depthMm);
  const safeFill = safeFillL(table);
  return {
    depthMm,
    ullageMm: table.heightMm - depthMm,
    volumeL,
    usableL: Math.max(0, volumeL - unusableL(table)),
    roomL: Math.max(0, safeFill - volumeL),
    aboveSafeFillL: Math.max(0, volumeL - safeFill),
    massKg: (volumeL * densityOf(table.settings)) / 1000,
    plusMinusL: plusMinusAt(table, depthMm),
  };
}

/** Litres at safe fill: a share of the whole liquid space. */
export function safeFillL({
  settings,
  capacityL,
}: Pick<DipTable, 'settings' | 'capacityL'>): number {
  return (settings.safeFillPercent / 100) * capacityL;
}

/** The reading at safe fill, mm; null when the stick does not reach it (a tilted tank). */
export function safeFillMm(table: DipTable): number | null {
  const litres = safeFillL(table);
  const { volumeL } = table.curve;
  const last = volumeL[volumeL.length - 1] ?? 0;
  // a share of 100 % may lie a rounding above the last row
  if (Math.abs(litres - last) <= 1e-9 * table.capacityL) return table.heightMm;
  return litres >= (volumeL[0] ?? 0) && litres <= last ? depthAt(table.curve, litres) : null;
}

/** Litres below the outlet; 0 when no outlet was told. */
export function unusableL({
  curve,
  settings,
  heightMm,
}: Pick<DipTable, 'curve' | 'settings' | 'heightMm'>): number {
  return settings.outletMm === null ? 0 : volumeAt(curve, Math.min(settings.outletMm, heightMm));
}

/** kg/m³: typed for this tank, or as the liquids list has it. */
export function densityOf({ densityKgPerM3, liquid }: TankSettings): number {
  return densityKgPerM3 ?? liquids[liquid].densityKgPerM3 ?? Number.NaN;
}

/** ± of the litres at a reading, linear between the rows. */
export function plusMinusAt(
  { curve, plusMinusL }: Pick<DipTable, 'curve' | 'plusMinusL'>,
  depthMm: number,
): number {
  return onTheLineAt(curve, plusMinusL, depthMm);
}

/** What is given at each row (in its own unit), at a reading on the straight line between two of them, mm. */
export function onTheLineAt(curve: Curve, atRows: ArrayLike<number>, depthMm: number): number {
  const i = segmentOf(curve.depthMm, depthMm);
  const x0 = curve.depthMm[i] ?? 0;
  const x1 = curve.depthMm[i + 1] ?? x0;
  const low = atRows[i] ?? 0;
  const high = atRows[i + 1] ?? low;
  return x1 === x0 ? low : low + ((high - low) * (depthMm - x0)) / (x1 - x0);
}
