import { z } from 'zod/v4';

/** Problem+json (RFC 9457) as every refusal is told. Some codes carry facts beside these. */
export const problemSchema = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  code: z.string(),
  requestId: z.string(),
  errors: z.array(z.object({ pointer: z.string(), detail: z.string() })),
});
