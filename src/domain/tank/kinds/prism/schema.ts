import { z } from 'zod/v4';
import { coordinate, greatestLengthMm, length, solidFields } from '../../solid';

const radius = z
  .number('Give the radius of a corner in millimetres.')
  .min(0, 'A radius is 0 mm or more.')
  .max(greatestLengthMm, 'A length is at most 100 000 mm.');

const point = z.tuple(
  [coordinate, coordinate, radius.optional()],
  'Give a point: [x, z], or [x, z, radius] for a rounded corner.',
);

/** A polygon in x and z, some of its corners rounded, extruded along y. */
export const prismSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('prism'),
  /** Once round, in either direction; places are the profile's own. */
  profile: z
    .array(point, 'Give the profile as a list of points: [x, z] or [x, z, radius].')
    .min(3, 'A profile has at least three points.')
    .max(200, 'A profile has at most 200 points.'),
  /** Along y. */
  width: length,
});
export type Prism = z.infer<typeof prismSchema>;
