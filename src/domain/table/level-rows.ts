import { wettedArea } from '../../geometry/wetted-area';
import type { LevelRow } from './level-row';
import type { LiquidSpace } from './liquid-space';
import { meshLevels } from './mesh-levels';
import type { ReadingFrame } from './preview';
import { tableRows } from './table-rows';

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
