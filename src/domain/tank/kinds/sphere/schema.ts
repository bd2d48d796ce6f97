import { z } from 'zod/v4';
import { length, solidFields } from '../../solid';

export const sphereSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('sphere'),
  diameter: length,
});
export type Sphere = z.infer<typeof sphereSchema>;
