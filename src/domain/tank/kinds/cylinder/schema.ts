import { z } from 'zod/v4';
import { length, solidFields } from '../../solid';

const notYet = ['cone', 'dish', 'ellipsoid', 'torisphere'];

/** Flat ends only, for now; another form of end is refused by name. */
const end = z.strictObject({
  form: z.literal('flat', {
    error: (issue) =>
      typeof issue.input === 'string' && notYet.includes(issue.input)
        ? `An end of the form "${issue.input}" is not computed yet: only "flat" is.`
        : 'The form of an end is "flat".',
  }),
});

export const cylinderSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('cylinder'),
  diameter: length,
  /** Straight part, along the axis. */
  length,
  axis: z.enum(['x', 'y', 'z'], 'The axis is "x", "y" or "z".').optional(),
  /** At the low end of the axis, at the high end. */
  ends: z.tuple([end, end], 'Give two ends: the low one and the high one.').optional(),
});
export type Cylinder = z.infer<typeof cylinderSchema>;
