import { afterAll, beforeAll, expect, it } from 'vitest';
import { boxDesign } from '../support/box-design';
import { callApi, signInAs } from '../support/call-api';
import type { Team } from '../../../db/seeds/add-workshop';
import { addTestWorkshop, openHouse, password, type House } from '../support/house';

let house: House;
let team: Team;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
});
afterAll(() => house.drop());

it('goes from sign-in to litres at a dip', async () => {
  const cookie = await signInAs(house, team.designer.email, password);
  const me = await callApi(house, 'GET', '/api/v1/me', { cookie });
  expect(await me.json()).toEqual({
    name: 'designer of Tarnside Outfitters',
    email: team.designer.email,
    role: 'designer',
    workshopName: 'Tarnside Outfitters',
  });

  const post = async (path: string, json: unknown, headers: Record<string, string> = {}) =>
    callApi(house, 'POST', path, { cookie, json, headers });
  const installation = await (
    await post('/api/v1/installations', { name: 'Hut', kind: 'place' })
  ).json();
  const made = await post('/api/v1/tanks', {
    installationId: installation.id,
    name: 'Cistern',
    liquid: 'drinking-water',
    design: boxDesign(1000, 500, 300),
  });
  expect(made.status).toBe(201);
  const tank = await made.json();
  expect(tank).toMatchObject({ installationName: 'Hut', revision: null, draftDiffers: true });
  expect(made.headers.get('location')).toBe(`/api/v1/tanks/${tank.id}`);

  const issued = await post(`/api/v1/tanks/${tank.id}/revisions`, { stepMm: 10 });
  expect(issued.status).toBe(201);
  const revision = await issued.json();
  expect(revision).toMatchObject({ letter: 'A', capacityL: 150, current: true });

  const volume = await callApi(
    house,
    'GET',
    `/api/v1/revisions/${revision.id}/volume?depthMm=123.5`,
    { cookie },
  );
  // closed form: 1000 × 500 × 123.5 mm³ = 61.75 L
  expect((await volume.json()).volumeL).toBeCloseTo(61.75, 9);
  const again = await callApi(house, 'GET', `/api/v1/tanks/${tank.id}`, { cookie });
  expect(await again.json()).toMatchObject({ draftDiffers: false, revision: { letter: 'A' } });
});
