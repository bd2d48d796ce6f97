import { DipwrightError } from '~/domain/errors';

/** The key by which a sending is known again. Throws `bad-request` without a usable one. */
export function readIdempotencyKey(request: Request): string {
  const key = request.headers.get('idempotency-key')?.trim() ?? '';
  if (!/^[\x21-\x7e]{1,200}$/.test(key)) {
    throw new DipwrightError(
      'bad-request',
      'Send the header Idempotency-Key: a new one for each reading, 1 to 200 letters, digits or signs without spaces.',
    );
  }
  return key;
}
