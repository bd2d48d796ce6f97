import { z } from 'zod/v4';
import { roles } from './roles';

/** GET /api/v1/me */
export const me = z.object({
  name: z.string(),
  email: z.string(),
  role: z.enum(roles),
  workshopName: z.string(),
});
export type Me = z.infer<typeof me>;

/** A member as others of the workshop see them. */
export const member = z.object({ id: z.string(), name: z.string(), role: z.enum(roles) });
export type Member = z.infer<typeof member>;
