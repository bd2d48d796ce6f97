import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { afterEach, describe, expect, it } from 'vitest';
import type { Handler } from '~/server/front/front';
import { openFrontServer, scriptText } from '../../support/front-server';

let opened: Awaited<ReturnType<typeof openFrontServer>> | undefined;
const open = async (handler: Handler, options?: Parameters<typeof openFrontServer>[1]) =>
  (opened = await openFrontServer(handler, options));
afterEach(async () => {
  await opened?.close();
  opened = undefined;
});

/** A page that says what it was told. */
const echo: Handler = async (request, response, _next, locals) => {
  const parts: Buffer[] = [];
  const body = (request as unknown as { body?: AsyncIterable<Buffer> }).body;
  if (body) for await (const part of body) parts.push(part);
  response.writeHead(200, { 'content-type': 'application/json' });
  response.end(
    JSON.stringify({
      url: request.url,
      headers: request.headers,
      body: Buffer.concat(parts).toString(),
      ...locals,
    }),
  );
};
const never: Handler = () => Promise.reject(new Error('the framework must not see this request'));
const json = { 'Content-Type': 'application/json' };

describe('a file that cannot be read any more', () => {
  it('is one answer and one line of the log, and the server goes on', async () => {
    const front = await open(echo);
    const headers = { Host: 'tarnside.example' };
    rmSync(join(front.folder, 'favicon.svg'));
    const answer = await front.ask('/favicon.svg', { headers });
    expect(answer.status).toBe(500);
    expect(answer.headers['content-security-policy']).toContain("default-src 'none'");
    expect(answer.headers.etag).toBeUndefined();
    expect(front.lines.filter((line) => line.includes('the front failed'))).toHaveLength(1);
    expect((await front.ask('/', { headers })).status).toBe(200);
  });
});

describe('host', () => {
  it.each([
    ['another name', 'evil.example', 421],
    ['another port', 'tarnside.example:81', 421],
    ['nonsense', 'tarnside.example/x', 400],
  ])('refuses %s', async (_what, host, status) => {
    const front = await open(never);
    const answer = await front.ask('/', { headers: { Host: host } });
    expect(answer.status).toBe(status);
    expect(answer.headers['content-security-policy']).toContain("default-src 'none'");
  });

  it('refuses a request without Host and one with two', async () => {
    const front = await open(never);
    expect(await front.raw('GET / HTTP/1.1\r\nConnection: close\r\n\r\n')).toMatch(
      /^HTTP\/1.1 400 /,
    );
    const two = await front.raw(
      'GET / HTTP/1.1\r\nHost: tarnside.example\r\nHost: evil.example\r\nConnection: close\r\n\r\n',
    );
    expect(two).toMatch(/^HTTP\/1.1 400 /);
  });

  it('takes the listed name in any case', async () => {
    const front = await open(echo);
    expect((await front.ask('/', { headers: { Host: 'Tarnside.EXAMPLE' } })).status).toBe(200);
  });
});

describe('paths', () => {
  it.each([
    '//evil.example/x',
    '/\\evil.example',
    '/a/../../etc/passwd',
    '/%2e%2e/secret',
    '/%zz',
    '/a%00b',
    '/a%5cb',
  ])('refuses %s before the framework sees it', async (path) => {
    const front = await open(never);
    expect((await front.ask(path)).status).toBe(400);
  });

  it.each(['/_image?href=x', '/_image', '/_server-islands/Thing', '/_actions/act', '/_IMAGE'])(
    'closes %s',
    async (path) => {
      const front = await open(never);
      const answer = await front.ask(path);
      expect(answer.status).toBe(404);
    },
  );

  it('refuses a method that is none of ours', async () => {
    const front = await open(never);
    const answer = await front.ask('/', { method: 'TRACE' });
    expect(answer.status).toBe(405);
    expect(answer.headers.allow).toContain('GET');
  });

  it('answers an unknown call with a problem and an unknown page with the page of that name', async () => {
    const front = await open(async (request, response, next) => {
      if (request.url !== '/404') return void (await next());
      response.writeHead(404, { 'content-type': 'text/html' });
      response.end('own page');
    });
    const call = await front.ask('/api/v1/nothing');
    expect(call.status).toBe(404);
    expect(call.headers['content-type']).toBe('application/problem+json; charset=utf-8');
    const page = await front.ask('/nothing', { headers: { Accept: 'text/html' } });
    expect(page.status).toBe(404);
    expect(page.body.toString()).toBe('own page');
  });
});

describe('headers of every answer', () => {
  const wanted = {
    'x-content-type-options': 'nosniff',
    'referrer-policy': 'no-referrer',
    'cross-origin-opener-policy': 'same-origin',
    'cross-origin-resource-policy': 'same-origin',
    'permissions-policy': expect.stringContaining('camera=()'),
    'content-security-policy': expect.stringContaining("frame-ancestors 'none'"),
    'x-request-id': expect.stringMatching(/^[0-9a-f-]{36}$/),
  };

  it.each(['/page', '/favicon.svg', '/_image', '/healthz', '/%zz', '/throws', '/empty-500'])(
    '%s',
    async (path) => {
      const front = await open(async (request, response, next, locals) => {
        if (request.url === '/throws') throw new Error('thrown by a page');
        if (request.url === '/empty-500') return void response.writeHead(500).end();
        await echo(request, response, next, locals);
      });
      const answer = await front.ask(path);
      expect(answer.headers).toMatchObject(wanted);
      expect(answer.headers['strict-transport-security']).toBeUndefined();
    },
  );

  it('allows neither inline code nor eval, and workers of our own only', async () => {
    const front = await open(echo);
    const policy = String((await front.ask('/')).headers['content-security-policy']);
    expect(policy).not.toMatch(/unsafe-inline|'unsafe-eval'|\*/);
    expect(policy).toContain("script-src 'self' 'wasm-unsafe-eval'");
    expect(policy).toContain("worker-src 'self'");
  });

  it('sends HSTS where browsers come over TLS', async () => {
    const front = await open(echo, { tls: true });
    expect((await front.ask('/')).headers['strict-transport-security']).toMatch(/^max-age=\d{8}/);
  });

  it('keeps of a page policy its hashes and nothing else', async () => {
    const hash = "'sha256-BF0290pkb3jxQsE7z00xR8Imp8X34FLC88L0lkMnrGw='";
    const front = await open(async (_request, response) => {
      response.writeHead(200, {
        'content-type': 'text/html',
        'content-security-policy': `script-src 'self' ${hash} 'unsafe-inline' https://evil.example; img-src *;`,
      });
      response.end('<p>page</p>');
    });
    const policy = String((await front.ask('/')).headers['content-security-policy']);
    expect(policy).toContain(`script-src 'self' 'wasm-unsafe-eval' ${hash};`);
    expect(policy).not.toMatch(/unsafe-inline|evil|\*/);
  });

  it('answers what is not HTTP with the same headers', async () => {
    const front = await open(never);
    const answer = await front.raw('NONSENSE\r\n\r\n');
    expect(answer).toMatch(/^HTTP\/1.1 400 /);
    expect(answer).toContain("Content-Security-Policy: default-src 'none'");
    const long = await front.raw(
      `GET / HTTP/1.1\r\nHost: tarnside.example\r\nX: ${'a'.repeat(20_000)}\r\n\r\n`,
    );
    expect(long).toMatch(/^HTTP\/1.1 431 /);
  });
});

describe('errors of the framework', () => {
  it('become a problem for a program, without the message of the error, which is logged', async () => {
    const front = await open(() => Promise.reject(new Error('boom at line 7')));
    const answer = await front.ask('/api/v1/me');
    expect(answer.status).toBe(500);
    const problem = JSON.parse(answer.body.toString()) as { requestId: string };
    expect(problem).toMatchObject({
      status: 500,
      code: 'internal',
      detail: expect.any(String),
      errors: [],
    });
    expect(answer.body.toString()).not.toContain('line 7');
    const logged = front.lines.find((line) => line.includes('boom at line 7'));
    expect(logged).toContain(problem.requestId);
  });

  it('become a plain page for a person, also where the framework gave an empty answer', async () => {
    const front = await open(
      async (_request, response) => void response.writeHead(500, 'Server error').end(),
    );
    const answer = await front.ask('/tanks', { headers: { Accept: 'text/html,*/*' } });
    expect(answer.status).toBe(500);
    expect(answer.headers['content-type']).toBe('text/html; charset=utf-8');
    expect(answer.body.toString()).toContain('<h1>Server error</h1>');
  });
});

describe('bodies', () => {
  const megabyte = 1024 * 1024;

  it('hands a body over whole', async () => {
    const front = await open(echo);
    const answer = await front.ask('/api/v1/compute', {
      method: 'POST',
      headers: json,
      body: '{"design":"ü"}',
    });
    expect(JSON.parse(answer.body.toString())).toMatchObject({ body: '{"design":"ü"}' });
  });

  it('takes exactly the cap', async () => {
    const front = await open(async (request, response) => {
      let length = 0;
      for await (const part of (request as unknown as { body: AsyncIterable<Buffer> }).body)
        length += part.length;
      response.writeHead(200, { 'content-type': 'text/plain' });
      response.end(String(length));
    });
    const answer = await front.ask('/api/v1/compute', {
      method: 'POST',
      headers: json,
      body: Buffer.alloc(megabyte, 32),
    });
    expect(answer.body.toString()).toBe(String(megabyte));
  });

  it.each([
    ['one announced too long', '/api/v1/compute', Buffer.alloc(megabyte + 1, 32)],
    [
      'one without a length',
      '/api/v1/compute',
      Array.from({ length: 20 }, () => Buffer.alloc(64 * 1024, 32)),
    ],
    ['a long sign-in', '/api/v1/session', Buffer.alloc(17 * 1024, 32)],
    ['any sent to a page', '/sign-in', Buffer.from('{}')],
  ])('refuses %s with 413', async (_what, path, body) => {
    const front = await open(never);
    const answer = await front.ask(path, { method: 'POST', headers: json, body });
    expect(answer.status).toBe(413);
    expect(answer.headers['content-type']).toBe('application/problem+json; charset=utf-8');
    expect(JSON.parse(answer.body.toString())).toMatchObject({ code: 'too-large', status: 413 });
    expect(answer.headers.connection).toBe('close');
  });

  it('cuts a client that sends its headers too slowly', async () => {
    const front = await open(never, { limits: { headersMs: 300, requestMs: 600 } });
    const answer = await front.raw('GET / HTTP/1.1\r\nHost: tarnside');
    expect(answer).toMatch(/^HTTP\/1.1 408 /);
  });

  it('cuts a client that sends its body too slowly', async () => {
    const front = await open(never, { limits: { headersMs: 300, requestMs: 600 } });
    const answer = await front.raw(
      'POST /api/v1/compute HTTP/1.1\r\nHost: tarnside.example\r\nContent-Type: application/json\r\nContent-Length: 50\r\n\r\n{',
    );
    expect(answer).toMatch(/^HTTP\/1.1 408 |^$/);
  });
});

describe('who asks', () => {
  const asked = async (trustedProxies: number, forwarded?: string) => {
    const front = await open(echo, { trustedProxies });
    const answer = await front.ask('/api/v1/me', {
      headers: {
        ...(forwarded ? { 'X-Forwarded-For': forwarded } : {}),
        'X-Forwarded-Host': 'evil.example',
        'X-Forwarded-Proto': 'https',
        Forwarded: 'for=1.2.3.4',
      },
    });
    return JSON.parse(answer.body.toString()) as {
      clientAddress: string;
      headers: Record<string, string>;
    };
  };

  it('believes no forwarding header without a trusted proxy, and passes none on', async () => {
    const { clientAddress, headers } = await asked(0, '203.0.113.9');
    expect(clientAddress).toBe('127.0.0.1');
    expect(Object.keys(headers).filter((name) => /forwarded/.test(name))).toEqual([]);
  });

  it('takes the address that the outermost trusted proxy saw', async () => {
    expect((await asked(1, '198.51.100.1, 203.0.113.9')).clientAddress).toBe('203.0.113.9');
    await opened?.close();
    expect((await asked(2, '10.0.0.1, 198.51.100.1, 203.0.113.9')).clientAddress).toBe(
      '198.51.100.1',
    );
  });

  it('falls back to the socket for nonsense', async () => {
    expect((await asked(1, 'a<script>')).clientAddress).toBe('127.0.0.1');
  });
});

describe('files', () => {
  it('keeps hashed names for ever, compressed where the client takes it', async () => {
    const front = await open(never);
    const plain = await front.ask('/_astro/piece.a1b2c3.js');
    expect(plain.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect(plain.headers['content-type']).toBe('text/javascript; charset=utf-8');
    expect(plain.body.toString()).toBe(scriptText);
    const packed = await front.ask('/_astro/piece.a1b2c3.js', {
      headers: { 'Accept-Encoding': 'gzip, br' },
    });
    expect(packed.headers['content-encoding']).toBe('br');
    expect(packed.headers.vary).toBe('Accept-Encoding');
    expect(brotliDecompressSync(packed.body).toString()).toBe(scriptText);
    expect(packed.headers.etag).not.toBe(plain.headers.etag);
    const again = await front.ask('/_astro/piece.a1b2c3.js', {
      headers: { 'If-None-Match': String(plain.headers.etag) },
    });
    expect(again.status).toBe(304);
    expect(again.body.length).toBe(0);
  });

  it('has other names checked each time, and answers HEAD without a body', async () => {
    const front = await open(never);
    const answer = await front.ask('/favicon.svg', { method: 'HEAD' });
    expect(answer.headers['cache-control']).toBe('no-cache');
    expect(Number(answer.headers['content-length'])).toBeGreaterThan(0);
    expect(answer.body.length).toBe(0);
  });

  it('knows only the names that were there at the start', async () => {
    const front = await open(async (_request, _response, next) => void (await next()));
    expect((await front.ask('/_astro/piece.a1b2c3.js.br')).status).toBe(404);
    expect((await front.ask('/_astro/')).status).toBe(404);
  });
});

describe('compression of pages', () => {
  const text = `<p>${'row '.repeat(2_000)}</p>`;
  const page: Handler = async (_request, response) => {
    response.writeHead(200, { 'content-type': 'text/html' });
    response.write(text.slice(0, 100));
    response.end(text.slice(100));
  };

  it('packs text in the way the client takes', async () => {
    const front = await open(page);
    const gzip = await front.ask('/', { headers: { 'Accept-Encoding': 'gzip' } });
    expect(gzip.headers['content-encoding']).toBe('gzip');
    expect(gunzipSync(gzip.body).toString()).toBe(text);
    const br = await front.ask('/', { headers: { 'Accept-Encoding': 'gzip, br;q=0.5' } });
    expect(brotliDecompressSync(br.body).toString()).toBe(text);
    const none = await front.ask('/', { headers: { 'Accept-Encoding': 'br;q=0' } });
    expect(none.headers['content-encoding']).toBeUndefined();
    expect(none.body.toString()).toBe(text);
  });

  it('leaves alone what is small, what is no text, and what carries a tag', async () => {
    const front = await open(async (request, response) => {
      const headers: Record<string, string> = { 'content-type': 'text/html' };
      if (request.url === '/pdf') headers['content-type'] = 'application/pdf';
      if (request.url === '/tagged') headers.etag = '"v7"';
      if (request.url === '/small') headers['content-length'] = '5';
      response.writeHead(200, headers);
      response.end(request.url === '/small' ? 'small' : text);
    });
    for (const path of ['/pdf', '/tagged', '/small']) {
      const answer = await front.ask(path, { headers: { 'Accept-Encoding': 'gzip' } });
      expect(answer.headers['content-encoding'], path).toBeUndefined();
      expect(answer.body.length, path).toBe(path === '/small' ? 5 : text.length);
    }
  });
});
