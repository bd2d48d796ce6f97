import { wettedArea } from '../../geometry/wetted-area';
import type { LiquidSpace } from './liquid-space';
import { meshLevels } from './mesh-levels';
import type { ReadingFrame } from './preview';
import type { TableRow } from './request';
import { tableRows } from './table-rows';

/** A row with all that is known of its level. More than what `strap` and /api/v1/compute print. */
export interface LevelRow extends TableRow {
  /**
   * Walls, floor and ceilings that the liquid touches, without its free surface, cm². Just above the level, like
   * the surface: a flat floor counts from the first drop. At the brim just below it: without the lid.
   */
  wettedCm2: number;
  /** Litres that a millimetre more of reading means: free surface times dLevel/dReading. */
  slopeLPerMm: number;
}

/** Like tableRows, with the wetted area and dV/dreading beside each. Readings mm, in the order given. */
export function levelRows(
  space: LiquidSpace,
  frame: ReadingFrame,
  readingsMm: readonly number[],
): LevelRow[] {
  const at = meshLevels(space, frame, readingsMm);
  const wetted = wettedArea(space.mesh, frame.up, at.ascending);
  return tableRows(space, frame, readingsMm, at).map((row, i) => ({
    ...row,
    wettedCm2: wetted[at.rows[i]!]! / 100,
    // 1 cm² × 1 mm = 1e-4 L
    slopeLPerMm: row.surfaceCm2 * 1e-4 * frame.levelPerReading,
  }));
}
