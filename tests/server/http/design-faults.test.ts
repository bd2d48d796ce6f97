import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Team } from '../../../db/seeds/add-workshop';
import { addIssuedTank, type Made } from '../support/add-tank';
import { boxDesign } from '../support/box-design';
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
  cookie = await cookieOf(house, team.designer);
});
afterAll(() => house.drop());

const flat = boxDesign(1000, 500, 0);
const oneFault = (pointer: string) => [
  { pointer, detail: 'Solid "body", height: a length is more than 0 mm.' },
];

it('POST /compute names the solid and the field, and points into what was sent', async () => {
  const response = await callApi(house, 'POST', '/api/v1/compute', {
    json: { design: flat, stepMm: 10 },
  });
  expect(response.status).toBe(422);
  const problem = await response.json();
  expect(problem.errors).toEqual(oneFault('/design/solids/0/height'));
  expect(problem.detail).toBe(problem.errors[0].detail);
});

it('so do a new tank and a saved draft', async () => {
  const { installationId } = made.tank;
  const added = await callApi(house, 'POST', '/api/v1/tanks', {
    cookie,
    json: { installationId, name: 'Flat', liquid: 'diesel', design: flat },
  });
  expect((await added.json()).errors).toEqual(oneFault('/design/solids/0/height'));
  const saved = await callApi(house, 'PUT', `/api/v1/tanks/${made.tank.id}/design`, {
    cookie,
    json: flat,
    headers: { 'if-match': '"1"' },
  });
  expect((await saved.json()).errors).toEqual(oneFault('/solids/0/height'));
});

it('what only the engine finds points into what was sent too', async () => {
  const [body] = boxDesign().solids;
  const two = { ...boxDesign(), solids: [body!, { ...body!, id: 'second' }] };
  const response = await callApi(house, 'POST', '/api/v1/compute', {
    json: { design: two, stepMm: 10 },
  });
  expect((await response.json()).errors[0].pointer).toBe('/design/solids');
});

it('a missing or wrong design, and a fault beside it, keep their own words', async () => {
  const errorsOf = async (json: unknown) =>
    (await (await callApi(house, 'POST', '/api/v1/compute', { json })).json()).errors;
  expect((await errorsOf({ stepMm: 10 }))[0].pointer).toBe('/design');
  expect((await errorsOf({ design: 'box', stepMm: 10 }))[0].pointer).toBe('/design');
  expect(await errorsOf({ design: boxDesign(), stepMm: 0 })).toEqual([
    { pointer: '/stepMm', detail: 'A step is more than 0 mm.' },
  ]);
  expect(await errorsOf({ design: boxDesign() })).toEqual([
    { pointer: '/stepMm', detail: 'Give either stepMm or atMm.' },
  ]);
});

it('a reading that is no number is told once', async () => {
  const path = `/api/v1/revisions/${made.revision.id}/volume?depthMm=deep`;
  const { errors } = await (await callApi(house, 'GET', path, { cookie })).json();
  expect(errors).toEqual([
    { pointer: '/depthMm', detail: 'Give depthMm in millimetres, such as 150 or 150.5.' },
  ]);
});
