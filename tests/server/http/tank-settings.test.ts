import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Team } from '../../../db/seeds/add-workshop';
import { addDraft } from '../support/add-tank';
import { callApi, cookieOf } from '../support/call-api';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let house: House;
let team: Team;
let cookie: string;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
  cookie = await cookieOf(house, team.designer);
});
afterAll(() => house.drop());

const change = async (tankId: string, json: unknown) =>
  callApi(house, 'PATCH', `/api/v1/tanks/${tankId}`, { cookie, json });

it('changes what is named and keeps the rest', async () => {
  const { tank } = await addDraft(house, team);
  const response = await change(tank.id, { outletMm: 25, name: 'Aft cistern' });
  expect(response.status).toBe(200);
  expect(await response.json()).toEqual({
    ...tank,
    name: 'Aft cistern',
    settings: { ...tank.settings, outletMm: 25 },
  });
});

it('says why LPG is not offered', async () => {
  const { tank } = await addDraft(house, team);
  for (const liquid of ['lpg', 'Propane']) {
    const response = await change(tank.id, { liquid });
    expect(response.status).toBe(422);
    const { errors } = await response.json();
    expect(errors[0].pointer).toBe('/liquid');
    expect(errors[0].detail).toContain('must never be opened or dipped');
  }
});

it('points at settings inside a new tank', async () => {
  const { installationId } = await addDraft(house, team);
  const json = { installationId, name: 'Oil', liquid: 'other' };
  const response = await callApi(house, 'POST', '/api/v1/tanks', { cookie, json });
  expect(response.status).toBe(422);
  expect((await response.json()).errors[0].pointer).toBe('/settings/densityKgPerM3');
  const right = { ...json, settings: { densityKgPerM3: 870 } };
  expect((await callApi(house, 'POST', '/api/v1/tanks', { cookie, json: right })).status).toBe(201);
});

it('begins a tank without a design as a plain box under its own name', async () => {
  const { installationId } = await addDraft(house, team);
  const json = { installationId, name: 'Day tank', liquid: 'diesel' };
  const made = await (await callApi(house, 'POST', '/api/v1/tanks', { cookie, json })).json();
  const design = await (
    await callApi(house, 'GET', `/api/v1/tanks/${made.id}/design`, { cookie })
  ).json();
  expect(design).toMatchObject({
    format: 'dipwright-tank',
    name: 'Day tank',
    solids: [{ kind: 'box' }],
  });
});
