import { z } from 'zod/v4';

/** GET /api/v1/revisions/{id}/depth: the reading at which so many litres stand. */
export const depthAnswer = z.object({
  depthMm: z.number(),
  volumeL: z.number(),
  /** null where the free surface has no width, as at the edge of a keel. */
  plusMinusMm: z.number().nullable(),
  /** Letter of the revision that says so. */
  revision: z.string(),
  current: z.boolean(),
});
export type DepthAnswer = z.infer<typeof depthAnswer>;
