import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import {
  request as httpRequest,
  type IncomingHttpHeaders,
  type OutgoingHttpHeaders,
} from 'node:http';
import { connect, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { brotliCompressSync } from 'node:zlib';
import type { DrainState } from '~/server/front/drain-state';
import { createFront, type Handler } from '~/server/front/front';
import { createHttpServer, timeLimits } from '~/server/front/http-server';
import { staticFiles } from '~/server/front/static-files';
import { createLog } from '~/server/log';

export interface Answer {
  status: number;
  headers: IncomingHttpHeaders;
  body: Buffer;
}

export const scriptText = `export const answer = ${'1 + '.repeat(600)}1;\n`;

/** The real front over real sockets, in front of a handler that a test gives. */
export async function openFrontServer(
  handler: Handler,
  options: {
    tls?: boolean;
    trustedProxies?: number;
    limits?: Partial<Record<keyof typeof timeLimits, number>>;
  } = {},
) {
  const folder = mkdtempSync(join(tmpdir(), 'dipwright-front-'));
  mkdirSync(join(folder, '_astro'));
  writeFileSync(join(folder, '_astro', 'piece.a1b2c3.js'), scriptText);
  writeFileSync(join(folder, '_astro', 'piece.a1b2c3.js.br'), brotliCompressSync(scriptText));
  writeFileSync(join(folder, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');

  const lines: string[] = [];
  const state: DrainState = { leaving: false };
  const http = {
    host: '127.0.0.1',
    port: 0,
    origin: options.tls ? 'https://tarnside.example' : 'http://tarnside.example',
    allowedHosts: ['tarnside.example'],
    trustedProxies: options.trustedProxies ?? 0,
    tls: options.tls ?? false,
    leaveSeconds: 0,
    drainSeconds: 5,
  };
  const log = createLog('debug', (line) => lines.push(line));
  const front = createFront({ config: { http }, log, state, files: staticFiles(folder), handler });
  const server = createHttpServer((request, response) => void front(request, response), http.tls, {
    ...timeLimits,
    ...options.limits,
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;

  return {
    /** Where its static files lie. */
    folder,
    server,
    state,
    lines,
    port,
    ask: (path: string, init: AskInit = {}) => ask(port, path, init),
    /** Sends these very bytes and gathers the answer until the connection ends. */
    raw: (bytes: string) => raw(port, bytes),
    async close() {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      rmSync(folder, { recursive: true });
    },
  };
}

interface AskInit {
  method?: string;
  headers?: OutgoingHttpHeaders;
  body?: string | Buffer | readonly Buffer[];
}

/** One request on a connection of its own. A list of buffers is sent without a length. */
function ask(
  port: number,
  path: string,
  { method = 'GET', headers = {}, body }: AskInit,
): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const request = httpRequest(
      {
        host: '127.0.0.1',
        port,
        path,
        method,
        agent: false,
        headers: { Host: 'tarnside.example', ...headers },
      },
      (response) => {
        const parts: Buffer[] = [];
        response.on('data', (part: Buffer) => parts.push(part));
        response.on('end', () =>
          resolve({
            status: response.statusCode ?? 0,
            headers: response.headers,
            body: Buffer.concat(parts),
          }),
        );
        response.on('error', reject);
      },
    );
    request.on('error', reject);
    if (Array.isArray(body)) for (const part of body as readonly Buffer[]) request.write(part);
    request.end(Array.isArray(body) ? undefined : body);
  });
}

function raw(port: number, bytes: string): Promise<string> {
  return new Promise((resolve, reject) => {
    const socket = connect(port, '127.0.0.1', () => socket.write(bytes));
    const parts: Buffer[] = [];
    socket.on('data', (part) => parts.push(part));
    socket.on('close', () => resolve(Buffer.concat(parts).toString('latin1')));
    socket.on('error', reject);
  });
}
