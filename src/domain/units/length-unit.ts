/** Lengths that a stick, a chart or a size may be given in. Kept in millimetres everywhere else. */
export const lengthUnits = ['mm', 'cm', 'in'] as const;
export type LengthUnit = (typeof lengthUnits)[number];

/** 1 inch = 25.4 mm exactly (international yard and pound agreement, 1959; NIST SP 811, App. B). */
export const mmPerInch = 25.4;
/** 1 foot = 12 inches. */
export const mmPerFoot = 304.8;

export const mmPerLengthUnit: Record<LengthUnit, number> = { mm: 1, cm: 10, in: mmPerInch };

/** The unit spelled out, as it stands in a sentence or in big type on paper. */
export const lengthUnitWords: Record<LengthUnit, string> = {
  mm: 'millimetres',
  cm: 'centimetres',
  in: 'inches and eighths',
};
