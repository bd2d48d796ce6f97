import { z } from 'zod/v4';
import { greatestLengthMm, length, solidFields } from '../../solid';

const endDiameter = z
  .number('Give a diameter in millimetres.')
  .min(0, 'A diameter is 0 mm or more.')
  .max(greatestLengthMm, 'A length is at most 100 000 mm.');

/** Frustum of a cone; one of its diameters may be 0. */
export const coneSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('cone'),
  /** Diameter at the low end of the axis. */
  start: endDiameter,
  /** Diameter at its high end. */
  end: endDiameter,
  /** Along the axis. */
  length,
  axis: z.enum(['x', 'y', 'z'], 'The axis is "x", "y" or "z".').optional(),
});
export type Cone = z.infer<typeof coneSchema>;
