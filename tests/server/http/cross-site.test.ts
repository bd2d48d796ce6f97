import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Team } from '../../../db/seeds/add-workshop';
import { callApi, cookieOf } from '../support/call-api';
import { addTestWorkshop, openHouse, ownOrigin, password, type House } from '../support/house';

let house: House;
let team: Team;
let cookie: string;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
  cookie = await cookieOf(house, team.manager);
});
afterAll(() => house.drop());

/** What a browser says of where a call comes from. Empty origin: the header is not sent. */
const sources: [string, Record<string, string>, boolean][] = [
  ['a page of ours, new browser', { origin: ownOrigin, 'sec-fetch-site': 'same-origin' }, true],
  ['a page of ours, old browser', { origin: ownOrigin }, true],
  ['typed by the person', { origin: '', 'sec-fetch-site': 'none' }, true],
  [
    'another site, new browser',
    { origin: 'https://evil.example', 'sec-fetch-site': 'cross-site' },
    false,
  ],
  ['another site, old browser', { origin: 'https://evil.example' }, false],
  ['a sibling host', { origin: 'http://x.127.0.0.1:4321', 'sec-fetch-site': 'same-site' }, false],
  ['another port', { origin: 'http://127.0.0.1:4322', 'sec-fetch-site': 'same-site' }, false],
  ['a sandboxed frame', { origin: 'null', 'sec-fetch-site': 'cross-site' }, false],
  ['a frame, old browser', { origin: 'null' }, false],
  ['no word of where from', { origin: '' }, false],
];
const methods = ['POST', 'PUT', 'PATCH', 'DELETE'];
const types = [
  'application/json',
  'text/plain',
  'application/x-www-form-urlencoded',
  'multipart/form-data; boundary=x',
  '',
];
const id = '01890000-0000-7000-8000-000000000000';
const pathOf: Record<string, string> = {
  POST: '/api/v1/installations',
  PUT: `/api/v1/tanks/${id}/design`,
  PATCH: `/api/v1/tanks/${id}`,
  DELETE: '/api/v1/session',
};

describe.each(sources)('with the cookie, from %s', (_name, headers, ours) => {
  it.each(methods.flatMap((method) => types.map((type) => [method, type] as const)))(
    '%s %s',
    async (method, type) => {
      const mine = await cookieOf(house, team.manager);
      const sent = { 'content-type': type, ...headers };
      if (type === '') delete (sent as Record<string, string>)['content-type'];
      const response = await callApi(house, method, pathOf[method]!, {
        cookie: mine,
        headers: sent,
        ...(method === 'DELETE'
          ? {}
          : { raw: new TextEncoder().encode('{"name":"Van","kind":"vehicle"}') }),
      });
      if (!ours) {
        expect(response.status).toBe(403);
        expect((await callApi(house, 'GET', '/api/v1/me', { cookie: mine })).status).toBe(200);
      } else {
        expect(response.status).not.toBe(403);
        // only JSON is read, whoever sends it
        if (method !== 'DELETE' && type !== 'application/json')
          expect([404, 415]).toContain(response.status);
      }
    },
  );
});

it('wrote nothing but what our own pages sent', async () => {
  const rows = await house.sql('SELECT id FROM installations');
  // POST as JSON from the three sources that are ours
  expect(rows).toHaveLength(3);
});

it('reading is not refused: nobody else may see the answer anyway', async () => {
  const headers = { origin: 'https://evil.example', 'sec-fetch-site': 'cross-site' };
  const response = await callApi(house, 'GET', '/api/v1/me', { cookie, headers });
  expect(response.status).toBe(200);
  expect(response.headers.has('access-control-allow-origin')).toBe(false);
});

it('a program without a cookie need not say where it comes from', async () => {
  const json = { email: team.manager.email, password };
  const response = await callApi(house, 'POST', '/api/v1/session', {
    json,
    headers: { origin: '' },
  });
  expect(response.status).toBe(204);
});

it('another site cannot sign a browser in to its own account', async () => {
  const json = { email: team.manager.email, password };
  const headers = { origin: 'https://evil.example', 'sec-fetch-site': 'cross-site' };
  const response = await callApi(house, 'POST', '/api/v1/session', { json, headers });
  expect(response.status).toBe(403);
});
