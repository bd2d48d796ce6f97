import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newId } from '~/server/database/new-id';
import { operations } from '~/server/openapi/operations';
import { recordReading } from '~/server/services/record-reading';
import { uploadMesh } from '~/server/services/upload-mesh';
import type { Team } from '../../../db/seeds/add-workshop';
import { asBinaryStl, boxMesh } from '../../geometry/mesh-import/mesh-files';
import { addDraft, addIssuedTank, type Made } from '../support/add-tank';
import { boxDesign } from '../support/box-design';
import { callApi, cookieOf, type Sent } from '../support/call-api';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let house: House;
let ours: Team;
let theirs: Team;
let made: Made;
let cookie: string;
/** Their manager; our owner, for a tank that was not handed over to them. */
let ownersCookie: string;
let unseen: Made['tank'];
let meshId: string;
beforeAll(async () => {
  house = await openHouse();
  ours = await addTestWorkshop(house, 'Tarnside Outfitters');
  theirs = await addTestWorkshop(house, 'Fellfoot Boats');
  made = await addIssuedTank(house, ours, { name: 'Secret cistern' });
  unseen = (await addDraft(house, ours, { name: 'Unseen tank' })).tank;
  await recordReading(house.context, ours.fitter, {
    tankId: made.tank.id,
    idempotencyKey: 'one',
    reading: { at: '2026-11-30T08:15:00Z', depthMm: 100, note: 'Secret note' },
  });
  const sent = (async function* () {
    yield asBinaryStl(boxMesh([900, 500, 300]));
  })();
  meshId = (
    await uploadMesh(house.context, ours.designer, { unit: 'mm', name: 'Secret shell', sent })
  ).id;
  cookie = await cookieOf(house, theirs.manager);
  ownersCookie = await cookieOf(house, ours.owner);
});
afterAll(() => house.drop());

/** What to send with each call that names a thing by its id. A new one without a sample fails below. */
const samples: Record<string, { suffix?: string; sent?: () => Sent }> = {
  readTank: {},
  changeTank: { sent: () => ({ json: { name: 'Taken' } }) },
  readDesign: {},
  saveDesign: { sent: () => ({ json: boxDesign(), headers: { 'if-match': '"1"' } }) },
  handOverTank: { sent: () => ({ json: { userId: theirs.owner.userId } }) },
  listHandovers: {},
  recordReading: {
    sent: () => ({
      json: { at: '2026-11-30T08:15:00Z', depthMm: 100 },
      headers: { 'idempotency-key': 'one' },
    }),
  },
  listReadings: {},
  issueRevision: { sent: () => ({ json: { stepMm: 20 } }) },
  listRevisions: {},
  readRevision: {},
  readTable: {},
  readTableCsv: {},
  lookUpVolume: { suffix: '?depthMm=100' },
  lookUpDepth: { suffix: '?volumeL=10' },
  renderChart: {},
  readMesh: {},
};
const byId = operations.filter(({ path }) => path.includes('{id}'));

describe('a thing of another workshop is not found', () => {
  it('by every call that names one', () => {
    expect(byId.map(({ id }) => id).sort()).toEqual(Object.keys(samples).sort());
  });

  it.each(byId.map(({ id }) => id))('%s', async (id) => {
    const { method, path } = byId.find((operation) => operation.id === id)!;
    const { suffix = '', sent } = samples[id]!;
    const whose = path.includes('/revisions/{id}')
      ? made.revision.id
      : path.includes('/meshes/{id}')
        ? meshId
        : made.tank.id;
    const ask = (thing: string) =>
      callApi(house, method, path.replace('{id}', thing) + suffix, { ...sent?.(), cookie });
    const response = await ask(whose);
    const text = await response.text();
    expect(response.status).toBe(404);
    expect(text).not.toMatch(/Secret|Tarnside|cistern/i);
    // and told in the same words as of a thing that never was
    const never = await ask(newId());
    const withoutRequest = (body: string) => body.replaceAll(/"requestId":"[^"]+"/g, '');
    expect(withoutRequest(await never.text())).toBe(withoutRequest(text));
  });
});

it('lists of another workshop hold nothing of ours', async () => {
  const lists = operations.filter(
    ({ id, path }) => id.startsWith('list') && !path.includes('{id}'),
  );
  expect(lists.length).toBeGreaterThanOrEqual(4);
  for (const { method, path } of lists) {
    const response = await callApi(house, method, path, { cookie });
    expect(response.status).toBe(200);
    expect(await response.text()).not.toMatch(/Secret|Tarnside|Unseen/i);
  }
});

it('a tank cannot be put into an installation of another workshop', async () => {
  const json = { installationId: made.installationId, name: 'Cuckoo', liquid: 'diesel' };
  const response = await callApi(house, 'POST', '/api/v1/tanks', { cookie, json });
  expect(response.status).toBe(422);
  expect((await response.json()).errors[0].pointer).toBe('/installationId');
});

it('a tank cannot be handed over to somebody of another workshop', async () => {
  const fitters = await cookieOf(house, ours.fitter);
  const path = `/api/v1/tanks/${made.tank.id}/handovers`;
  const response = await callApi(house, 'POST', path, {
    cookie: fitters,
    json: { userId: theirs.owner.userId },
  });
  expect(response.status).toBe(422);
  expect((await response.json()).errors[0].pointer).toBe('/userId');
});

describe('an owner sees only what was handed over', () => {
  it('in the list', async () => {
    const tanks = await (
      await callApi(house, 'GET', '/api/v1/tanks', { cookie: ownersCookie })
    ).json();
    expect(tanks.map((tank: { id: string }) => tank.id)).toEqual([made.tank.id]);
    const places = await (
      await callApi(house, 'GET', '/api/v1/installations', { cookie: ownersCookie })
    ).json();
    expect(places.map((place: { id: string }) => place.id)).toEqual([made.installationId]);
  });

  it('and is told "not found" of the rest', async () => {
    for (const rest of ['', '/revisions', '/readings']) {
      const path = `/api/v1/tanks/${unseen.id}${rest}`;
      expect((await callApi(house, 'GET', path, { cookie: ownersCookie })).status).toBe(404);
    }
  });

  it('and hears nothing of drafts', async () => {
    const path = `/api/v1/tanks/${made.tank.id}`;
    const tank = await (await callApi(house, 'GET', path, { cookie: ownersCookie })).json();
    expect(tank.draftDiffers).toBe(false);
    expect((await callApi(house, 'GET', `${path}/design`, { cookie: ownersCookie })).status).toBe(
      403,
    );
  });
});
