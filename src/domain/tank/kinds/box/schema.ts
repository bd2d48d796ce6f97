import { z } from 'zod/v4';
import { greatestLengthMm, length, solidFields } from '../../solid';

const radius = z
  .number('Give the radius of an edge in millimetres.')
  .min(0, 'A radius is 0 mm or more.')
  .max(greatestLengthMm, 'A length is at most 100 000 mm.');

/** Rectangular box, its edges sharp or rounded. */
export const boxSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('box'),
  /** Along x. */
  length,
  /** Along y. */
  width: length,
  /** Along z. */
  height: length,
  /** Radius of the four edges along x, along y, along z. Default 0. */
  edges: z
    .strictObject(
      { x: radius.optional(), y: radius.optional(), z: radius.optional() },
      'Give the radii of the edges as { "x", "y", "z" }.',
    )
    .optional(),
});
export type Box = z.infer<typeof boxSchema>;
