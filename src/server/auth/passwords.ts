import { hash, verify } from '@node-rs/argon2';
import { oneOfTwo } from './two-at-a-time';

/** argon2id, the package's default kind: 19 MiB, two passes, one lane. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** For addresses without an account: verified against, so that they take the same time. Of no password. */
const nobody = oneOfTwo(() => hash(crypto.randomUUID(), cost));

export async function hashPassword(password: string): Promise<string> {
  return oneOfTwo(() => hash(password, cost));
}

/** `kept` null: there is no such account; the same work is done and the answer is no. */
export async function passwordFits(kept: string | null, password: string): Promise<boolean> {
  const against = kept ?? (await nobody);
  const fits = await oneOfTwo(() => verify(against, password));
  return fits && kept !== null;
}
