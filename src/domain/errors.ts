/**
 * The errors that Dipwright raises on purpose. Each carries a code (for programs), a sentence
 * for the person (`message`) and, where a field is at fault, the place and what would be right.
 * They rise untouched and become problem+json once, in server/http.
 */
export const errorCodes = [
  'bad-request', // cannot be read at all
  'invalid', // read, but a field is wrong
  'unauthenticated',
  'forbidden',
  'not-found',
  'conflict',
  'precondition-failed', // somebody saved first
  'precondition-required', // a save without If-Match
  'too-large',
  'unsupported-media-type',
  'method-not-allowed',
  'rate-limited',
  'unavailable',
] as const;

export type ErrorCode = (typeof errorCodes)[number];

/** A fault in one field. `pointer` is a JSON Pointer (RFC 6901) into what was sent. */
export interface FieldFault {
  pointer: string;
  detail: string;
}

export class DipwrightError extends Error {
  readonly code: ErrorCode;
  readonly faults: readonly FieldFault[];
  /** Facts for programs that travel beside the problem, e.g. `{ etag }` or `{ retryAfterS }`. */
  readonly facts: Readonly<Record<string, unknown>>;

  constructor(
    code: ErrorCode,
    message: string,
    options: {
      faults?: readonly FieldFault[];
      facts?: Readonly<Record<string, unknown>>;
      cause?: unknown;
    } = {},
  ) {
    super(message, { cause: options.cause });
    this.name = 'DipwrightError';
    this.code = code;
    this.faults = options.faults ?? [];
    this.facts = options.facts ?? {};
  }
}

/** `what`: the noun of what was asked for. The same words whether it is not there or of another workshop. */
export function notFound(what: string): DipwrightError {
  return new DipwrightError('not-found', `There is no such ${what}, or it is not yours to see.`);
}

/** One field at fault: `pointer` leads to it, `detail` says what would be right and is the message too. */
export function invalid(pointer: string, detail: string): DipwrightError {
  return new DipwrightError('invalid', detail, { faults: [{ pointer, detail }] });
}
