import { z } from 'zod/v4';

/** The vehicle, boat or place that a tank is fitted in. */
export const installationKinds = ['vehicle', 'boat', 'place'] as const;

export const newInstallation = z.strictObject({
  name: z
    .string()
    .trim()
    .min(1, 'Name the vehicle, boat or place.')
    .max(120, 'A name has at most 120 characters.'),
  kind: z.enum(installationKinds, 'Choose vehicle, boat or place.'),
});
export type NewInstallation = z.infer<typeof newInstallation>;

export const installation = z.object({
  id: z.string(),
  name: z.string(),
  kind: z.enum(installationKinds),
});
export type Installation = z.infer<typeof installation>;
