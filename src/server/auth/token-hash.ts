import { createHash } from 'node:crypto';

/** SHA-256 in hex. A session token is 200 random bits, so a plain hash of it cannot be reversed by guessing. */
export function tokenHash(token: string): string {
  return createHash('sha256').update(token, 'utf8').digest('hex');
}
