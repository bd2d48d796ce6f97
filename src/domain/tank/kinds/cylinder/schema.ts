import { z } from 'zod/v4';
import { length, solidFields } from '../../solid';

const inward = z.boolean('Whether an end is turned inward is true or false.').optional();

/**
 * An end of the barrel. It stands out of the straight part on the side of its depth; turned inward, it stands into
 * it and takes liquid space away.
 */
const end = z.discriminatedUnion(
  'form',
  [
    z.strictObject({ form: z.literal('flat'), inward }),
    z.strictObject({ form: z.literal('cone'), depth: length, inward }),
    /** Cap of a sphere, at most half of it. */
    z.strictObject({ form: z.literal('dish'), depth: length, inward }),
    /** Half a spheroid. */
    z.strictObject({ form: z.literal('ellipsoid'), depth: length, inward }),
    /** Cap of a sphere of radius `crown`, joined to the barrel by a ring of radius `knuckle`. */
    z.strictObject({ form: z.literal('torisphere'), crown: length, knuckle: length, inward }),
  ],
  'The form of an end is "flat", "cone", "dish", "ellipsoid" or "torisphere".',
);
export type End = z.infer<typeof end>;

export const cylinderSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('cylinder'),
  diameter: length,
  /** Straight part, along the axis; ends stand outside it. */
  length,
  axis: z.enum(['x', 'y', 'z'], 'The axis is "x", "y" or "z".').optional(),
  /** At the low end of the axis, at the high end; both flat when left out. */
  ends: z.tuple([end, end], 'Give two ends: the low one and the high one.').optional(),
});
export type Cylinder = z.infer<typeof cylinderSchema>;
