import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Team } from '../../../db/seeds/add-workshop';
import { addDraft, addIssuedTank, type Made } from '../support/add-tank';
import { callApi, cookieOf } from '../support/call-api';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let house: House;
let team: Team;
let made: Made;
let cookie: string;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
  made = await addIssuedTank(house, team);
  cookie = await cookieOf(house, team.owner);
});
afterAll(() => house.drop());

const dip = { at: '2026-11-30T09:15:00+01:00', depthMm: 120, note: 'After the weekend' };
const send = (key: string | null, json: unknown, tankId = made.tank.id) =>
  callApi(house, 'POST', `/api/v1/tanks/${tankId}/readings`, {
    cookie,
    json,
    headers: key === null ? {} : { 'idempotency-key': key },
  });
const stored = async (key: string) =>
  house.sql<{ id: string }>('SELECT id FROM readings WHERE idempotency_key = ?', [key]);

it('keeps a reading once: 201, again the same answer, another body 422', async () => {
  const first = await send('key-1', dip);
  expect(first.status).toBe(201);
  const body = await first.json();
  // the box of 1000 × 500 × 300 mm: half a litre a millimetre; 95 % of its 150 L is the safe fill
  expect(body).toMatchObject({
    at: '2026-11-30T08:15:00.000Z',
    depthMm: 120,
    volumeL: 60,
    usableL: 60,
    roomL: 82.5,
    revision: 'A',
    by: 'owner of Tarnside Outfitters',
    note: 'After the weekend',
  });
  expect(body.massKg).toBeCloseTo(60 * 0.998, 9);

  // the same, with its keys in another order
  const again = await send('key-1', { note: dip.note, depthMm: dip.depthMm, at: dip.at });
  expect(again.status).toBe(201);
  expect(await again.json()).toEqual(body);

  const other = await send('key-1', { ...dip, depthMm: 121 });
  expect(other.status).toBe(422);
  expect((await other.json()).code).toBe('invalid');
  expect(await stored('key-1')).toHaveLength(1);
});

it('keeps one of twenty that come at once under the same key', async () => {
  const answers = await Promise.all(Array.from({ length: 20 }, () => send('key-2', dip)));
  expect(answers.map(({ status }) => status)).toEqual(Array.from({ length: 20 }, () => 201));
  const ids = new Set(
    (await Promise.all(answers.map((answer) => answer.json()))).map(({ id }) => id),
  );
  expect(ids.size).toBe(1);
  expect(await stored('key-2')).toHaveLength(1);
});

it('lets two tanks use the same key', async () => {
  const other = await addIssuedTank(house, team, { name: 'Second' });
  expect((await send('key-1', { ...dip, depthMm: 50 }, other.tank.id)).status).toBe(201);
});

it('tells keys apart by case', async () => {
  expect((await send('Key-1', { ...dip, depthMm: 33 })).status).toBe(201);
});

it('asks for a key', async () => {
  for (const key of [null, '', 'two words', 'x'.repeat(201)]) {
    const response = await send(key, dip);
    expect(response.status).toBe(400);
    expect((await response.json()).detail).toContain('Idempotency-Key');
  }
});

it('asks a reading outside the stick back and keeps nothing', async () => {
  for (const depthMm of [300.5, 1e5, -1]) {
    const response = await send('outside', { ...dip, depthMm });
    expect(response.status).toBe(422);
    expect((await response.json()).errors[0].pointer).toBe('/depthMm');
  }
  expect(await stored('outside')).toHaveLength(0);
});

it('refuses senders that are not settled yet, by name', async () => {
  const response = await send('ohms', { at: dip.at, ohms: 134.5 });
  expect(response.status).toBe(422);
  const pointers = (await response.json()).errors.map(
    ({ pointer }: { pointer: string }) => pointer,
  );
  expect(pointers).toContain('/ohms');
});

it('refuses a time that cannot be', async () => {
  for (const at of [
    '0000-01-01T00:00:00Z',
    '1969-12-31T23:59:59Z',
    '9999-12-31T23:59:59Z',
    'yesterday',
  ]) {
    const response = await send('when', { ...dip, at });
    expect(response.status).toBe(422);
    expect((await response.json()).errors[0].pointer).toBe('/at');
  }
});

it('says that a tank without a table has no litres', async () => {
  const { tank } = await addDraft(house, team);
  const fitters = await cookieOf(house, team.fitter);
  const response = await callApi(house, 'POST', `/api/v1/tanks/${tank.id}/readings`, {
    cookie: fitters,
    json: dip,
    headers: { 'idempotency-key': 'none' },
  });
  expect(response.status).toBe(409);
});

it('lists the last ones, latest first, as many as asked for', async () => {
  const path = `/api/v1/tanks/${made.tank.id}/readings`;
  await send('later', { at: '2026-11-30T10:00:00Z', depthMm: 60 });
  const all = await (await callApi(house, 'GET', path, { cookie })).json();
  expect(all[0]).toMatchObject({ depthMm: 60, volumeL: 30 });
  const one = await (await callApi(house, 'GET', `${path}?most=1`, { cookie })).json();
  expect(one).toEqual([all[0]]);
  for (const most of ['0', '501', '1.5', 'many', '']) {
    expect((await callApi(house, 'GET', `${path}?most=${most}`, { cookie })).status).toBe(422);
  }
});
