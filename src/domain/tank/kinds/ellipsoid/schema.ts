import { z } from 'zod/v4';
import { length, solidFields } from '../../solid';

export const ellipsoidSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('ellipsoid'),
  /** Along x. */
  length,
  /** Along y. */
  width: length,
  /** Along z. */
  height: length,
});
export type Ellipsoid = z.infer<typeof ellipsoidSchema>;
