import { z } from 'zod/v4';
import { solidSchema } from './kinds/registry';
import { coordinate, greatestLengthMm, length, point } from './solid';

/**
 * The tank design document, version 1: the one description of a tank's shape. Lengths mm,
 * angles degrees; frame as in solid.ts. Unknown keys are an error.
 */
const tilt = z
  .number('Give a slope in degrees.')
  .min(-60, 'A slope lies within ± 60°.')
  .max(60, 'A slope lies within ± 60°.');

export const tankDocument = z
  .strictObject({
    format: z.literal('dipwright-tank', 'The format is "dipwright-tank".'),
    version: z.literal(1, 'The version is 1.'),
    name: z
      .string('Give the tank a name.')
      .min(1, 'Give the tank a name.')
      .max(120, 'A name has at most 120 characters.'),
    solids: z
      .array(solidSchema, 'Give a list of solids.')
      .min(1, 'A tank needs at least one solid.')
      .max(200, 'A tank has at most 200 solids.'),
    wall: z
      .discriminatedUnion(
        'sizes',
        [
          z.strictObject({ sizes: z.literal('inside'), thickness: length.optional() }),
          /** The thickness comes off every outer face of what holds. */
          z.strictObject({ sizes: z.literal('outside'), thickness: length }),
        ],
        'Sizes are "inside" or "outside".',
      )
      .optional(),
    attitude: z
      .strictObject({
        /** Positive when the +x end is lower. */
        pitch: tilt,
        /** Positive when the +y end is lower. */
        roll: tilt,
      })
      .optional(),
    stick: z
      .strictObject({
        at: z.tuple([coordinate, coordinate], 'Give two numbers: x, y.'),
        /** A z; left out: the floor of the liquid space at the stick. */
        zero: z.number().min(-greatestLengthMm).max(greatestLengthMm).optional(),
      })
      .optional(),
    outlet: point.optional(),
    vent: point.optional(),
  })
  .superRefine((document, context) => {
    const seen = new Set<string>();
    document.solids.forEach((solid, index) => {
      if (seen.has(solid.id)) {
        context.addIssue({
          code: 'custom',
          path: ['solids', index, 'id'],
          message: `Two solids have the id "${solid.id}": every id is given once.`,
        });
      }
      seen.add(solid.id);
    });
  });
export type TankDocument = z.infer<typeof tankDocument>;
