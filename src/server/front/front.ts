import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import type { Config } from '../config';
import type { Log } from '../log';
import { bodyCap, isStreamed } from './body-caps';
import { clientAddress } from './client-address';
import { isClosedRoute } from './closed-routes';
import type { DrainState } from './drain-state';
import { hostFault } from './host-allow-list';
import { discardRest, readBody, streamBody } from './read-body';
import { refusals, refuse, tooLarge, type Refusal } from './refuse';
import { requestPath } from './request-path';
import { securityHeaders } from './security-headers';
import { shapeResponse } from './shape-response';
import type { StaticFiles } from './static-files';

/** What the framework is told about a request, beside the request itself. */
export interface FrontLocals {
  requestId: string;
  clientAddress: string;
}

/** The framework's handler: answers, or calls `next` when it knows no such route. */
export type Handler = (
  request: IncomingMessage,
  response: ServerResponse,
  next: () => void | Promise<void>,
  locals: FrontLocals,
) => Promise<void>;

export interface FrontParts {
  config: Pick<Config, 'http'>;
  log: Log;
  state: DrainState;
  files: StaticFiles;
  handler: Handler;
}

const methods = new Set(['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS']);

/**
 * What every request walks through before a page or a call of the API sees it: Host, path, method,
 * closed routes, files, body cap; and what every answer carries.
 */
export function createFront({ config, log, state, files, handler }: FrontParts) {
  const headers = securityHeaders(config.http.tls);

  /** Never rejects: whatever fails on the way is one answer and one line of the log. */
  return async function front(request: IncomingMessage, response: ServerResponse): Promise<void> {
    const requestId = randomUUID();
    try {
      await answer(request, response, requestId);
    } catch (error) {
      const { method, url } = request;
      log.error('the front failed', { error, method, path: requestPath(url), requestId });
      if (response.headersSent) response.destroy();
      else failed(request, response, requestId);
    }
  };

  async function answer(
    request: IncomingMessage,
    response: ServerResponse,
    requestId: string,
  ): Promise<void> {
    const startedAt = performance.now();
    for (const [name, value] of Object.entries(headers)) response.setHeader(name, value);
    response.setHeader('X-Request-Id', requestId);
    if (state.leaving) response.setHeader('Connection', 'close');
    const method = request.method ?? '';
    const say = (refusal: Refusal) => refuse(refusal, request, response, requestId);

    const fault = hostFault(request.rawHeaders, config.http.allowedHosts);
    if (fault) return say(fault === 400 ? refusals.malformedHost : refusals.foreignHost);
    const path = requestPath(request.url);
    if (path === null) return say(refusals.malformedPath);
    if (!methods.has(method)) return say(refusals.method);
    if (isClosedRoute(path)) return say(refusals.notFound);

    response.once('close', () => {
      log.debug('request', {
        method,
        path,
        status: response.statusCode,
        ms: Math.round(performance.now() - startedAt),
        requestId,
      });
    });
    if (path === '/readyz' && state.leaving) return sayLeaving(response);
    const reads = method === 'GET' || method === 'HEAD';
    if (reads && (await files.serve(path, request, response))) return;
    if (!reads) {
      const cap = bodyCap(path);
      const body = isStreamed(path) ? streamBody(request, cap) : await readBody(request, cap);
      if (body === 'gone') return void response.destroy();
      if (body === 'too-large') {
        response.setHeader('Connection', 'close');
        say(tooLarge(cap));
        return discardRest(request);
      }
      Object.assign(request, { body: 'bytes' in body ? onePiece(body.bytes) : body.pieces });
      if ('pieces' in body) {
        response.once('finish', () => {
          if (!request.complete) discardRest(request);
        });
      }
    }

    const locals = {
      requestId,
      clientAddress: clientAddress(
        request.socket.remoteAddress,
        request.headers['x-forwarded-for']?.toString(),
        config.http.trustedProxies,
      ),
    };
    dropClaims(request);
    shapeResponse(request, response, { requestId, fileHashes: files.hashes });
    try {
      await handler(request, response, () => unknownRoute(path), locals);
    } catch (error) {
      log.error('the framework failed', { error, method, path, requestId });
      if (response.headersSent) response.destroy();
      else say(refusals.failed);
    }

    /** Pages get the product's own "not found" page; the API a problem. */
    function unknownRoute(at: string): void | Promise<void> {
      if (at.startsWith('/api/') || !reads) return say(refusals.notFound);
      request.url = '/404';
      return handler(request, response, () => say(refusals.notFound), locals);
    }
  }
}

/** What a half-made answer said of itself (length, coding, tag) goes; the headers of every answer stay. */
function failed(request: IncomingMessage, response: ServerResponse, requestId: string): void {
  for (const name of ['ETag', 'Content-Encoding', 'Vary']) response.removeHeader(name);
  refuse(refusals.failed, request, response, requestId);
}

function sayLeaving(response: ServerResponse): void {
  response.statusCode = 503;
  response.setHeader('Cache-Control', 'no-store');
  response.setHeader('Content-Type', 'application/json');
  response.end(
    '{"ready":false,"checks":[{"name":"process","fit":false,"detail":"The server is leaving."}]}',
  );
}

/** The framework takes a body from `request.body`, as an iterable of bytes. */
async function* onePiece(bytes: Buffer) {
  yield bytes;
}

/** Headers that would make the framework believe a stranger about host, scheme, address or route. */
function dropClaims(request: IncomingMessage): void {
  for (const name of Object.keys(request.headers)) {
    if (name.startsWith('x-forwarded-') || name.startsWith('x-astro-') || name === 'forwarded') {
      delete request.headers[name];
    }
  }
}
