import { z } from 'zod/v4';
import { coordinate, length, solidFields } from '../../solid';

/** Rectangular frustum with level ends: a hopper, a bin. */
export const taperSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('taper'),
  /** Along x and along y, at the low end. */
  bottom: z.tuple([length, length], 'Give two lengths: along x, along y.'),
  /** The same at the high end. */
  top: z.tuple([length, length], 'Give two lengths: along x, along y.'),
  /** Along z. */
  height: length,
  /** Where the centre of the top stands against the centre of the bottom. Default 0, 0. */
  shift: z.tuple([coordinate, coordinate], 'Give two numbers: along x, along y.').optional(),
});
export type Taper = z.infer<typeof taperSchema>;
