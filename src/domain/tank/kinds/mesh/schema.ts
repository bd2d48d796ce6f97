import { z } from 'zod/v4';
import { solidFields } from '../../solid';

/** A closed triangle mesh from an STL or OBJ file. */
export const meshSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('mesh'),
  /** On the server the id that an upload answered; for the command line a path beside the design file. */
  upload: z
    .string('Give the id of an uploaded mesh, or the path of its file.')
    .min(1, 'Give the id of an uploaded mesh, or the path of its file.')
    .max(200, 'The id or path of a mesh has at most 200 characters.'),
  /** Millimetres to a unit of the file. Default 1. */
  scale: z
    .number('Give the scale in millimetres to a unit of the file.')
    .positive('A scale is more than 0.')
    .max(1e9, 'A scale is at most 1 000 000 000.')
    .optional(),
});
export type MeshSolid = z.infer<typeof meshSchema>;
