import { DipwrightError } from '~/domain/errors';

/**
 * The strong entity tags that If-Match names. Throws `precondition-required` without one: also for
 * `*`, which would write over what nobody read. A weak tag never matches, so it is not returned.
 */
export function readIfMatch(request: Request): string[] {
  const header = request.headers.get('if-match')?.trim() ?? '';
  if (header === '' || header === '*') {
    throw new DipwrightError(
      'precondition-required',
      'Send If-Match with the ETag that you read, so that nobody’s work is written over unseen.',
    );
  }
  return header
    .split(',')
    .map((tag) => tag.trim())
    .filter((tag) => /^"[^"]*"$/.test(tag));
}
