import { z } from 'zod/v4';

/** Forms of sign-in and sign-up: the same schemas in the browser and on the server. */
export const email = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, 'An address has at most 254 characters.')
  .regex(/^[^\s@]+@[^\s@]+\.[^\s@]+$/, 'Give an e-mail address such as name@firm.example.');

export const newPassword = z
  .string()
  .min(12, 'A password needs at least 12 characters.')
  .max(200, 'A password has at most 200 characters.');

export const signIn = z.strictObject({
  email,
  password: z.string().min(1, 'Type your password.').max(200, 'A password has at most 200 characters.'),
});
export type SignIn = z.infer<typeof signIn>;

export const signUp = z.strictObject({
  workshopName: z
    .string()
    .trim()
    .min(1, 'Name your workshop.')
    .max(120, 'A workshop name has at most 120 characters.'),
  name: z.string().trim().min(1, 'Give your own name.').max(120, 'A name has at most 120 characters.'),
  email,
  password: newPassword,
});
export type SignUp = z.infer<typeof signUp>;
