import type { IncomingMessage, ServerResponse } from 'node:http';
import type { ErrorCode } from '~/domain/errors';

/** What a refusal of the front says: the same sentence to a person and to a program. */
export interface Refusal {
  status: number;
  title: string;
  detail: string;
  code: ErrorCode | 'internal';
}

export const refusals = {
  malformedHost: {
    status: 400,
    title: 'Bad request',
    code: 'bad-request',
    detail: 'The request needs one well-formed Host header.',
  },
  foreignHost: {
    status: 421,
    title: 'Misdirected request',
    code: 'bad-request',
    detail: 'This server does not answer under that host name.',
  },
  malformedPath: {
    status: 400,
    title: 'Bad request',
    code: 'bad-request',
    detail: 'The address of the request cannot be read.',
  },
  method: {
    status: 405,
    title: 'Method not allowed',
    code: 'method-not-allowed',
    detail: 'Use GET, HEAD, POST, PUT, PATCH or DELETE.',
  },
  notFound: {
    status: 404,
    title: 'Not found',
    code: 'not-found',
    detail: 'There is nothing at this address.',
  },
  unavailable: {
    status: 503,
    title: 'Not available',
    code: 'unavailable',
    detail:
      'The database cannot be reached at the moment. Nothing was changed; try again in a minute.',
  },
  failed: {
    status: 500,
    title: 'Server error',
    code: 'internal',
    detail: 'Something went wrong on our side. Nothing was half done; try again.',
  },
} as const satisfies Record<string, Refusal>;

export function tooLarge(cap: number): Refusal {
  const most =
    cap === 0
      ? 'no body'
      : `a body of at most ${cap.toLocaleString('en').replaceAll(',', ' ')} bytes`;
  return {
    status: 413,
    title: 'Too large',
    code: 'too-large',
    detail: `This address takes ${most}.`,
  };
}

/** problem+json for programs and the API, otherwise a plain page that needs no file. */
export function refusalBody(
  refusal: Refusal,
  request: IncomingMessage,
  requestId: string,
): { type: string; text: string } {
  const wantsPage =
    !(request.url ?? '').startsWith('/api/') &&
    (request.headers.accept ?? '').includes('text/html');
  if (wantsPage) return { type: 'text/html; charset=utf-8', text: page(refusal) };
  const { status, title, detail, code } = refusal;
  const problem = { type: `/api#${code}`, title, status, detail, code, requestId, errors: [] };
  return { type: 'application/problem+json; charset=utf-8', text: JSON.stringify(problem) };
}

export function refuse(
  refusal: Refusal,
  request: IncomingMessage,
  response: ServerResponse,
  requestId: string,
): void {
  const { type, text } = refusalBody(refusal, request, requestId);
  response.statusCode = refusal.status;
  response.setHeader('Content-Type', type);
  response.setHeader('Cache-Control', 'no-store');
  if (refusal.status === 405) response.setHeader('Allow', 'GET, HEAD, POST, PUT, PATCH, DELETE');
  response.setHeader('Content-Length', Buffer.byteLength(text));
  response.end(request.method === 'HEAD' ? undefined : text);
}

function page({ title, detail }: Refusal): string {
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${title} · Dipwright</title></head>
<body><main><h1>${title}</h1><p>${detail}</p><p><a href="/">To the front page</a></p></main></body>
</html>
`;
}
