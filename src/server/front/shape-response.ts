import type { IncomingMessage, OutgoingHttpHeaders, ServerResponse } from 'node:http';
import {
  constants,
  createBrotliCompress,
  createGzip,
  type BrotliCompress,
  type Gzip,
} from 'node:zlib';
import { acceptedEncoding } from './accepted-encoding';
import { refusalBody, refusals, type Refusal } from './refuse';
import { contentSecurityPolicy } from './security-headers';

export interface Shaping {
  requestId: string;
  /** CSP hashes not worth sending: those of files. */
  fileHashes: ReadonlySet<string>;
}

const both = new Set(['br', 'gzip'] as const);
const textual = /^(text\/|application\/(json|problem\+json|javascript|manifest\+json)|image\/svg)/;

/**
 * Puts the last hand to whatever the framework answers: one merged CSP, a body where an error came
 * without one, compression of text. It does so at `writeHead`, the one moment when status and
 * headers are known and nothing is sent.
 */
export function shapeResponse(
  request: IncomingMessage,
  response: ServerResponse,
  shaping: Shaping,
): void {
  const original = {
    writeHead: response.writeHead.bind(response) as (status: number) => ServerResponse,
    write: response.write.bind(response) as (chunk: unknown) => boolean,
    end: response.end.bind(response) as (chunk?: unknown) => ServerResponse,
  };
  let packer: BrotliCompress | Gzip | null = null;
  let replaced = false;

  const writeHead = (
    status: number,
    second?: string | OutgoingHttpHeaders,
    third?: OutgoingHttpHeaders,
  ) => {
    const headers = typeof second === 'object' ? second : (third ?? {});
    for (const [name, value] of Object.entries(headers)) {
      if (value !== undefined) response.setHeader(name, value);
    }
    mergePolicy(response, headers, shaping.fileHashes);
    if (status >= 400 && !response.hasHeader('content-type')) {
      replaced = true;
      const { type, text } = refusalBody(refusalOf(status), request, shaping.requestId);
      response.setHeader('Content-Type', type);
      response.setHeader('Cache-Control', 'no-store');
      response.setHeader('Content-Length', Buffer.byteLength(text));
      original.writeHead(status);
      original.end(request.method === 'HEAD' ? undefined : text);
      return response;
    }
    packer = packerFor(request, response, status);
    if (packer) {
      response.removeHeader('Content-Length');
      packer.on('data', (part: Buffer) => {
        if (!original.write(part)) packer?.pause();
      });
      packer.on('end', () => original.end());
      packer.on('error', () => response.destroy());
      response.on('drain', () => packer?.resume());
      response.on('close', () => packer?.destroy());
    }
    return original.writeHead(status);
  };

  response.writeHead = writeHead as typeof response.writeHead;
  response.write = ((chunk: unknown) => {
    if (!response.headersSent && !packer && !replaced) response.writeHead(response.statusCode);
    if (replaced) return true;
    return packer ? packer.write(chunk) : original.write(chunk);
  }) as typeof response.write;
  response.end = ((chunk?: unknown) => {
    const body = typeof chunk === 'function' ? undefined : chunk;
    if (!response.headersSent && !packer && !replaced) response.writeHead(response.statusCode);
    if (replaced) return response;
    if (!packer) return original.end(body);
    packer.end(body);
    return response;
  }) as typeof response.end;
}

function mergePolicy(
  response: ServerResponse,
  headers: OutgoingHttpHeaders,
  drop: ReadonlySet<string>,
): void {
  const name = Object.keys(headers).find((key) => key.toLowerCase() === 'content-security-policy');
  if (name === undefined) return;
  response.setHeader('Content-Security-Policy', contentSecurityPolicy(String(headers[name]), drop));
}

function refusalOf(status: number): Refusal {
  const known = Object.values<Refusal>(refusals).find((refusal) => refusal.status === status);
  return known ?? { ...(status >= 500 ? refusals.failed : refusals.malformedPath), status };
}

function packerFor(request: IncomingMessage, response: ServerResponse, status: number) {
  const type = String(response.getHeader('content-type') ?? '');
  const hasBody = request.method !== 'HEAD' && status >= 200 && status !== 204 && status !== 304;
  // What carries a tag keeps its bytes: a saved design is matched by its strong ETag.
  if (!textual.test(type) || response.hasHeader('etag')) return null;
  response.appendHeader('Vary', 'Accept-Encoding');
  if (!hasBody || response.hasHeader('content-encoding')) return null;
  const length = Number(response.getHeader('content-length') ?? Infinity);
  const encoding =
    length < 1_000 ? null : acceptedEncoding(request.headers['accept-encoding'], both);
  if (encoding === null) return null;
  response.setHeader('Content-Encoding', encoding);
  return encoding === 'br'
    ? createBrotliCompress({ params: { [constants.BROTLI_PARAM_QUALITY]: 4 } })
    : createGzip({ level: 6 });
}
