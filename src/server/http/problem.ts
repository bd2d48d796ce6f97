import type { DipwrightError, ErrorCode } from '~/domain/errors';

/** The one map from our codes to HTTP. */
export const statusOf: Record<ErrorCode, number> = {
  'bad-request': 400,
  unauthenticated: 401,
  forbidden: 403,
  'not-found': 404,
  'method-not-allowed': 405,
  conflict: 409,
  'precondition-failed': 412,
  'too-large': 413,
  'unsupported-media-type': 415,
  invalid: 422,
  'precondition-required': 428,
  'rate-limited': 429,
  unavailable: 503,
};

const titles: Record<ErrorCode, string> = {
  'bad-request': 'Cannot be read',
  unauthenticated: 'Not signed in',
  forbidden: 'Not allowed',
  'not-found': 'Not found',
  'method-not-allowed': 'Not a method of this address',
  conflict: 'In conflict with what stands',
  'precondition-failed': 'Somebody saved first',
  'too-large': 'Too large',
  'unsupported-media-type': 'Not JSON',
  invalid: 'A field is wrong',
  'precondition-required': 'The version is missing',
  'rate-limited': 'Too many calls',
  unavailable: 'Not available just now',
};

/** Problem+json (RFC 9457) for an error raised on purpose, with its facts beside it. */
export function problem(
  error: DipwrightError,
  requestId: string,
  headers: Readonly<Record<string, string>> = {},
): Response {
  const { code, message, faults, facts } = error;
  const status = statusOf[code];
  const { retryAfterS } = facts;
  const wait = typeof retryAfterS === 'number' ? retryAfterS : code === 'unavailable' ? 5 : null;
  const body = {
    ...facts,
    type: `/api#${code}`,
    title: titles[code],
    status,
    detail: message,
    code,
    requestId,
    errors: faults,
  };
  return answer(status, body, {
    ...(wait === null ? {} : { 'retry-after': String(wait) }),
    ...headers,
  });
}

/** A fault of ours: its cause is in the log under the request's id, not in the answer. */
export function internalProblem(requestId: string): Response {
  return answer(500, {
    type: '/api#internal',
    title: 'A fault of ours',
    status: 500,
    detail: `Something failed on our side. Nothing you sent was half kept. If it goes on, name the request ${requestId}.`,
    code: 'internal',
    requestId,
    errors: [],
  });
}

function answer(
  status: number,
  body: object,
  headers: Readonly<Record<string, string>> = {},
): Response {
  return new Response(JSON.stringify(body), {
    status,
    headers: {
      'content-type': 'application/problem+json; charset=utf-8',
      'cache-control': 'no-store',
      ...headers,
    },
  });
}
