import { z } from 'zod/v4';

/** POST /api/v1/tanks/{id}/handovers: from then on this owner sees the tank. */
export const newHandover = z.strictObject({
  userId: z.string('Choose an owner.').min(1, 'Choose an owner.').max(64, 'Choose an owner.'),
});
export type NewHandover = z.infer<typeof newHandover>;

export const handover = z.object({
  userId: z.string(),
  name: z.string(),
  handedOverAt: z.string(),
  handedOverBy: z.string(),
});
export type Handover = z.infer<typeof handover>;
