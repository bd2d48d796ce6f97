import type { Cylinder } from '~/domain/tank/kinds/cylinder/schema';
import { kindOf } from '~/domain/tank/kinds/registry';
import { formatLengthWithUnit } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';

/** How long a cylinder is over its ends, where that is more than its straight part. */
export function TipToTip({ solid, unit }: { solid: Cylinder; unit: LengthUnit }) {
  const along = ({ x: 0, y: 1, z: 2 } as const)[solid.axis ?? 'x'];
  const overallMm = kindOf(solid).extent(solid)[along];
  if (overallMm <= solid.length) return null;
  return (
    <p className="label self-end pb-1.5">
      straight, tip to tip {formatLengthWithUnit(overallMm, unit)}
    </p>
  );
}
