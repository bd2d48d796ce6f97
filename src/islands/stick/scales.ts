import { mmPerLengthUnit, type LengthUnit } from '~/domain/units/length-unit';
import {
  litresPerVolumeUnit,
  volumeUnitSigns,
  volumeUnits,
  type VolumeUnit,
} from '~/domain/units/volume-unit';
import type { Scale } from './Stick';

/** Scales of the stick by unit. */
export const lengthScales: Record<LengthUnit, Scale> = {
  mm: { per: mmPerLengthUnit.mm, label: 'mm' },
  cm: { per: mmPerLengthUnit.cm, label: 'cm' },
  in: { per: mmPerLengthUnit.in, label: 'in', eighths: true },
};

export const volumeScales = Object.fromEntries(
  volumeUnits.map((unit) => [
    unit,
    { per: litresPerVolumeUnit[unit], label: volumeUnitSigns[unit] },
  ]),
) as Record<VolumeUnit, Scale>;
