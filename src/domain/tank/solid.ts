import { z } from 'zod/v4';

/**
 * Fields every solid has, whatever its kind. Lengths mm, angles degrees, in the tank's own frame
 * (right-handed, z up when the tank stands level, x along, y across).
 */
export const greatestLengthMm = 100_000;

export const length = z
  .number('Give a length in millimetres.')
  .positive('A length is more than 0 mm.')
  .max(greatestLengthMm, 'A length is at most 100 000 mm.');

export const coordinate = z
  .number('Give a place in millimetres.')
  .min(-greatestLengthMm, 'A place lies within ± 100 000 mm.')
  .max(greatestLengthMm, 'A place lies within ± 100 000 mm.');

export const point = z.tuple([coordinate, coordinate, coordinate], 'Give three numbers: x, y, z.');

export const angle = z.number('Give an angle in degrees.').min(-360, 'An angle lies within ± 360°.').max(360, 'An angle lies within ± 360°.');

export const solidFields = {
  id: z
    .string('Give the solid an id.')
    .min(1, 'An id has at least one character.')
    .max(64, 'An id has at most 64 characters.'),
  /** `holds` adds liquid space, `displaces` takes it away; order does not matter. */
  role: z.enum(['holds', 'displaces'], 'The role is "holds" or "displaces".'),
  /** Lowest corner (least x, y, z) of the solid's own upright box, before turning. Default 0, 0, 0. */
  at: point.optional(),
  /** Turned about the centre of that box: about x first, then y, then z, fixed axes. Default 0, 0, 0. */
  turn: z.tuple([angle, angle, angle], 'Give three angles: about x, y, z.').optional(),
};

export type Vec3 = readonly [number, number, number];

/** What every kind's document entry has in common. */
export interface SolidFields {
  id: string;
  role: 'holds' | 'displaces';
  at?: [number, number, number] | undefined;
  turn?: [number, number, number] | undefined;
}
