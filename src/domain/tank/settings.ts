import { z } from 'zod/v4';
import { liquidCodes, lpgRefusal, pressurisedNames } from '../liquid/liquids';

/** A code of the liquids list; a pressurised gas is refused with the reason. */
export const liquidCode = z.enum(liquidCodes, {
  error: (issue) =>
    typeof issue.input === 'string' && pressurisedNames.includes(issue.input.trim().toLowerCase())
      ? lpgRefusal
      : `Choose a liquid of the list: ${liquidCodes.join(', ')}.`,
});

/** How the sizes were found: gives each of them its ± (half of a 95 % interval), mm. */
export const measuredBy = ['tape', 'drawing', 'stated'] as const;

const percent = z
  .number('Give the safe fill in % of brim.')
  .min(1, 'Safe fill lies between 1 and 100 % of brim.')
  .max(100, 'Safe fill lies between 1 and 100 % of brim.');

/**
 * What belongs to a tank beside its shape. Frozen into a revision with the shape.
 * Lengths are mm; heights are readings along the stick from its zero.
 */
export const tankSettings = z.strictObject({
  liquid: liquidCode,
  /** Only for the liquid "other". */
  densityKgPerM3: z
    .number('Give the density in kg/m³.')
    .min(400, 'A density lies between 400 and 3000 kg/m³.')
    .max(3000, 'A density lies between 400 and 3000 kg/m³.')
    .nullable(),
  safeFillPercent: percent,
  /** Where the outlet stops drawing; what stands below is unusable. null: not told, nothing is called unusable. */
  outletMm: z
    .number('Give the outlet height in millimetres.')
    .min(0, 'An outlet height is 0 mm or more.')
    .max(100_000)
    .nullable(),
  /** Zero of the stick to the rim of the dip hole; finds a worn or shortened stick. null: not measured. */
  referenceHeightMm: z
    .number('Give the reference height in millimetres.')
    .positive('A reference height is more than 0 mm.')
    .max(100_000)
    .nullable(),
  measuredBy: z.enum(measuredBy, 'Choose tape, drawing or stated.'),
  /** ± of each size, mm: tape 2, drawing 1, stated as given. */
  sizePlusMinusMm: z
    .number('Give the ± of a size in millimetres.')
    .min(0, 'A ± is 0 or more.')
    .max(1000),
  /**
   * ± of single sizes where it differs from that of all, mm, by their key (sizeKey): `{ "body/length": 0.5 }`. A key
   * whose solid or size is gone is not looked at. Left out when there is none.
   */
  ownSizePlusMinusMm: z
    .record(
      z.string().max(200, 'The name of a size has at most 200 characters.'),
      z
        .number('Give the ± of a size in millimetres.')
        .min(0, 'A ± is 0 or more.')
        .max(1000, 'A ± is at most 1000 mm.'),
      'Give the ± of single sizes as an object: { "body/length": 0.5 }.',
    )
    .refine((own) => Object.keys(own).length <= 400, 'At most 400 sizes may have a ± of their own.')
    .optional(),
  /** ± of a dip reading, mm. */
  dipPlusMinusMm: z
    .number('Give the ± of a dip in millimetres.')
    .min(0, 'A ± is 0 or more.')
    .max(1000),
});
export type TankSettings = z.infer<typeof tankSettings>;

export const sizePlusMinusByMeans = { tape: 2, drawing: 1 } as const;
