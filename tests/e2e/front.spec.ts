import { expect, test } from '@playwright/test';

/* What the entry promises of every answer, asked of the built product. */

const pages = ['/', '/sign-in', '/sign-up', '/api'];
const elsewhere = [
  '/no-such-page',
  '/api/v1/no-such-call',
  '/api/openapi.json',
  '/api/v1/liquids',
  '/healthz',
  '/readyz',
  '/home',
];

for (const path of [...pages, ...elsewhere]) {
  test(`security headers on ${path}`, async ({ request }) => {
    const { headers } = await request
      .get(path, { maxRedirects: 0 })
      .then((answer) => ({ headers: answer.headers() }));
    const policy = headers['content-security-policy'] ?? '';
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toMatch(/unsafe-inline|'unsafe-eval'|\*|http/);
    expect(headers).toMatchObject({
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'no-referrer',
      'cross-origin-opener-policy': 'same-origin',
      'cross-origin-resource-policy': 'same-origin',
    });
  });
}

for (const path of [
  '/_image?href=/favicon.svg&w=10',
  '/_image',
  '/_server-islands/Anything',
  '/_actions/anything',
]) {
  test(`${path} is closed`, async ({ request }) => {
    expect((await request.get(path)).status()).toBe(404);
    expect((await request.post(path, { data: {} })).status()).toBe(404);
  });
}

test('another host name is refused before anything else', async ({ request }) => {
  expect((await request.get('/', { headers: { Host: 'evil.example' } })).status()).toBe(421);
});

test('a page for members leads to sign-in and back, on this host only', async ({
  request,
  baseURL,
}) => {
  const answer = await request.get('/tanks/some-id?view=end', { maxRedirects: 0 });
  expect(answer.status()).toBe(303);
  expect(answer.headers().location).toBe('/sign-in?next=%2Ftanks%2Fsome-id%3Fview%3Dend');
  expect((await request.get(`${baseURL}//evil.example/`, { maxRedirects: 0 })).status()).toBe(400);
});

test('a body past its cap is a 413 problem', async ({ request }) => {
  const answer = await request.post('/api/v1/compute', { data: { design: 'x'.repeat(1_100_000) } });
  expect(answer.status()).toBe(413);
  expect(answer.headers()['content-type']).toContain('application/problem+json');
  expect(await answer.json()).toMatchObject({ code: 'too-large', errors: [] });
});

test.describe('another site may not act: method × origin × content type', () => {
  const foreign: Record<string, string>[] = [
    { Origin: 'http://evil.example', 'Sec-Fetch-Site': 'cross-site' },
    { Origin: 'null', 'Sec-Fetch-Site': 'cross-site' },
    { 'Sec-Fetch-Site': 'same-site' },
    { Origin: 'http://evil.example' },
    {},
  ];
  const types = [
    'application/json',
    'text/plain',
    'application/x-www-form-urlencoded',
    'multipart/form-data; boundary=x',
  ];

  test('with a cookie every one is refused and nothing is done', async ({ request, baseURL }) => {
    const signedIn = await request.post('/api/v1/session', {
      data: { email: 'manager@tarnside.example', password: 'true-litres-2026' },
      headers: { Origin: baseURL ?? '' },
    });
    expect(signedIn.status()).toBe(204);
    const before = await (await request.get('/api/v1/installations')).json();
    for (const headers of foreign) {
      for (const type of types) {
        const init = {
          headers: { ...headers, 'Content-Type': type },
          data: '{"name":"Planted","kind":"place"}',
        };
        expect(
          (await request.post('/api/v1/installations', init)).status(),
          JSON.stringify(init.headers),
        ).toBe(403);
      }
      expect(
        (await request.delete('/api/v1/session', { headers })).status(),
        JSON.stringify(headers),
      ).toBe(403);
    }
    expect(await (await request.get('/api/v1/installations')).json()).toEqual(before);
    expect((await request.get('/api/v1/me')).status()).toBe(200);
  });
});

test('files with hashed names are kept for ever and sent packed', async ({ request }) => {
  const page = await (await request.get('/')).text();
  const script = /"(\/_astro\/[^"]+\.js)"/.exec(page)?.[1] ?? '';
  expect(script).not.toBe('');
  const answer = await request.get(script, { headers: { 'Accept-Encoding': 'br' } });
  expect(answer.headers()).toMatchObject({
    'cache-control': 'public, max-age=31536000, immutable',
    'content-encoding': 'br',
  });
});
