import { createServer, STATUS_CODES, type RequestListener, type Server } from 'node:http';
import { securityHeaders } from './security-headers';

export const timeLimits = {
  /** From the first byte of a request to the last of its headers. */
  headersMs: 10_000,
  /** To the last byte of its body. */
  requestMs: 30_000,
  /** Between two requests of one connection; longer than a proxy keeps its own. */
  keepAliveMs: 65_000,
  /** Without a byte either way. */
  silenceMs: 120_000,
} as const;

/** The HTTP server with its limits. What cannot be read as HTTP gets an answer with all headers too. */
export function createHttpServer(
  listener: RequestListener,
  tls: boolean,
  limits: {
    headersMs: number;
    requestMs: number;
    keepAliveMs: number;
    silenceMs: number;
  } = timeLimits,
): Server {
  const server = createServer(
    {
      maxHeaderSize: 16 * 1024,
      headersTimeout: limits.headersMs,
      requestTimeout: limits.requestMs,
      keepAliveTimeout: limits.keepAliveMs,
      connectionsCheckingInterval: Math.min(2_000, limits.headersMs),
      // Our own front answers a missing Host, with the headers of every answer.
      requireHostHeader: false,
    },
    listener,
  );
  server.timeout = limits.silenceMs;
  server.maxHeadersCount = 100;
  server.on('clientError', (error: NodeJS.ErrnoException, socket) => {
    if (error.code === 'ECONNRESET' || !socket.writable) return void socket.destroy();
    const status = statusOf[error.code ?? ''] ?? 400;
    const lines = Object.entries(securityHeaders(tls)).map(([name, value]) => `${name}: ${value}`);
    socket.end(
      [
        `HTTP/1.1 ${status} ${STATUS_CODES[status]}`,
        ...lines,
        'Content-Length: 0',
        'Connection: close',
        '',
        '',
      ].join('\r\n'),
    );
  });
  return server;
}

const statusOf: Record<string, number> = {
  HPE_HEADER_OVERFLOW: 431,
  ERR_HTTP_REQUEST_TIMEOUT: 408,
};
