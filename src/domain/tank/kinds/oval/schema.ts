import { z } from 'zod/v4';
import { length, solidFields } from '../../solid';

/** Elliptic section with flat ends, lying along x or y. */
export const ovalSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('oval'),
  /** Along the axis. */
  length,
  /** Across it, level. */
  width: length,
  /** Along z. */
  height: length,
  axis: z.enum(['x', 'y'], 'The axis of an oval is "x" or "y".').optional(),
});
export type Oval = z.infer<typeof ovalSchema>;
