import type { DipTable } from "~/domain/table/answer-at";
import { curveFromRows } from "~/domain/table/curve";
import type { Preview } from "~/domain/table/preview";
import type { TankSettings } from "~/domain/tank/settings";

/**
 * The live preview as a table that answers dips. Its ± holds the dip and the computing until the
 * share of the sizes has been worked out; then all three.
 */
export function liveTable(
  preview: Preview,
  settings: TankSettings,
  sizesPlusMinusL: ArrayLike<number> | null,
): DipTable {
  const curve = curveFromRows(preview.rows, preview.frame.levelPerReading);
  return {
    curve,
    plusMinusL: Float64Array.from(curve.slopeLPerMm, (slope, row) =>
      Math.hypot(
        slope * settings.dipPlusMinusMm,
        preview.errorL,
        sizesPlusMinusL?.[row] ?? 0,
      ),
    ),
    heightMm: preview.frame.heightMm,
    capacityL: preview.capacityL,
    settings,
  };
}
