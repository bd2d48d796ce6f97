import { z } from 'zod/v4';
import { length, solidFields } from '../../solid';

/** Right-triangle prism: full height at x = 0, falling to nothing at x = length. */
export const wedgeSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('wedge'),
  /** Along x. */
  length,
  /** Along y. */
  width: length,
  /** Along z, at x = 0. */
  height: length,
});
export type Wedge = z.infer<typeof wedgeSchema>;
