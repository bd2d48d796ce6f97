import type { Scale } from './Stick';

export type LengthUnit = 'mm' | 'cm' | 'in';
export type VolumeUnit = 'l' | 'usgal' | 'impgal';

/** Scales of the stick by unit. Inch 25.4 mm, US gallon 3.785411784 L, imperial 4.54609 L: exact. */
export const lengthScales: Record<LengthUnit, Scale> = {
  mm: { per: 1, label: 'mm' },
  cm: { per: 10, label: 'cm' },
  in: { per: 25.4, label: 'in', eighths: true },
};

export const volumeScales: Record<VolumeUnit, Scale> = {
  l: { per: 1, label: 'L' },
  usgal: { per: 3.785411784, label: 'US gal' },
  impgal: { per: 4.54609, label: 'imp gal' },
};
