/** Volumes that litres may be shown in. A bare "gal" is never one of them. */
export const volumeUnits = ['l', 'usgal', 'impgal'] as const;
export type VolumeUnit = (typeof volumeUnits)[number];

/** 1 US gallon = 231 cubic inches exactly (NIST Handbook 44, App. C) = 3.785411784 L. */
export const litresPerUsGallon = 3.785411784;
/** 1 imperial gallon = 4.54609 L exactly (Weights and Measures Act 1985, Sch. 1; SI 1995/1804). */
export const litresPerImperialGallon = 4.54609;

export const litresPerVolumeUnit: Record<VolumeUnit, number> = {
  l: 1,
  usgal: litresPerUsGallon,
  impgal: litresPerImperialGallon,
};

/** The unit spelled out: in a sentence, a column head, big type on paper. */
export const volumeUnitWords: Record<VolumeUnit, string> = {
  l: 'litres',
  usgal: 'US gallons',
  impgal: 'imperial gallons',
};

/** The unit beside a figure. Gallons always say which. */
export const volumeUnitSigns: Record<VolumeUnit, string> = {
  l: 'L',
  usgal: 'US gal',
  impgal: 'imp gal',
};
