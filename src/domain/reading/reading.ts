import { z } from 'zod/v4';

/**
 * A dip as it was taken, kept with the revision whose table said what it means.
 * Ohms, milliamps, volts and percent wait for the sender settings and are refused by name.
 */
export const newReading = z.strictObject({
  /** When it was taken: an ISO 8601 instant with its offset. */
  at: z.iso.datetime({ offset: true, error: 'Give the time as 2026-11-30T08:15:00Z.' }),
  /** Reading along the stick from its zero, mm. */
  depthMm: z.number('Give the depth in millimetres.').min(0, 'A depth is 0 mm or more.').max(100_000),
  note: z.string().trim().max(500, 'A note has at most 500 characters.').optional(),
});
export type NewReading = z.infer<typeof newReading>;

export const reading = z.object({
  id: z.string(),
  at: z.string(),
  depthMm: z.number(),
  volumeL: z.number(),
  usableL: z.number(),
  roomL: z.number(),
  massKg: z.number(),
  plusMinusL: z.number(),
  /** Letter of the revision that gave the litres. */
  revision: z.string(),
  note: z.string().nullable(),
  by: z.string(),
});
export type Reading = z.infer<typeof reading>;
