import { z } from 'zod/v4';
import { boxSchema } from './box/schema';
import { cylinderSchema } from './cylinder/schema';
import { wedgeSchema } from './wedge/schema';

/** Kinds of the document format that are not computed yet: refused by name. */
export const kindsToCome = ['oval', 'sphere', 'ellipsoid', 'cone', 'taper', 'prism', 'stations', 'mesh'];

export const solidSchema = z.discriminatedUnion('kind', [boxSchema, cylinderSchema, wedgeSchema], {
  error: (issue) => {
    const kind = (issue.input as { kind?: unknown } | null)?.kind;
    return typeof kind === 'string' && kindsToCome.includes(kind)
      ? `A solid of the kind "${kind}" is not computed yet: use box, cylinder or wedge.`
      : 'The kind of a solid is box, cylinder or wedge.';
  },
});
export type Solid = z.infer<typeof solidSchema>;
