import { z } from 'zod/v4';
import { length, solidFields } from '../../solid';

/** Rectangular box. Rounded edges are not computed yet: `edges` may be left out or all 0. */
const edge = z.literal(
  0,
  'Rounded edges of a box are not computed yet: leave edges out or give 0.',
);

export const boxSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('box'),
  /** Along x. */
  length,
  /** Along y. */
  width: length,
  /** Along z. */
  height: length,
  edges: z.strictObject({ x: edge.optional(), y: edge.optional(), z: edge.optional() }).optional(),
});
export type Box = z.infer<typeof boxSchema>;
