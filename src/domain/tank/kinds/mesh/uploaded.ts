import { z } from 'zod/v4';

/** Units that a mesh file may be drawn in, and millimetres to each. */
export const meshUnits = { mm: 1, cm: 10, m: 1000, in: 25.4 } as const;
export type MeshUnit = keyof typeof meshUnits;

/** What comes with the file of POST /api/v1/meshes. The unit has no default: STL and OBJ do not say it. */
export const meshUpload = z.object({
  unit: z.enum(['mm', 'cm', 'm', 'in'], 'Say in which unit the file is drawn: mm, cm, m or in.'),
  name: z.string().trim().min(1).max(120, 'A name has at most 120 characters.').default('mesh'),
});
export type MeshUpload = z.infer<typeof meshUpload>;

/** A mesh that was taken: give its id as `upload` of a solid, and `scale` with it. */
export const uploadedMesh = z.object({
  id: z.string(),
  name: z.string(),
  triangles: z.number().int(),
  /** Millimetres to a unit of the file. */
  scale: z.number(),
  /** Lengths along x, y, z. */
  extentMm: z.tuple([z.number(), z.number(), z.number()]),
  volumeL: z.number(),
  /** What was mended, one sentence each. */
  notes: z.array(z.string()),
});
export type UploadedMesh = z.infer<typeof uploadedMesh>;
