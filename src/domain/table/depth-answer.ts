import { z } from 'zod/v4';

/** GET /api/v1/revisions/{id}/depth: the reading at which so many litres stand. */
export const depthAnswer = z.object({
  depthMm: z.number(),
  volumeL: z.number(),
  /** How far the reading moves when the litres move by their ±. */
  plusMinusMm: z.number(),
  /** Letter of the revision that says so. */
  revision: z.string(),
  current: z.boolean(),
});
export type DepthAnswer = z.infer<typeof depthAnswer>;
