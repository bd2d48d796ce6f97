import { afterAll, beforeAll, expect, it } from 'vitest';
import type { TankDocument } from '~/domain/tank/document';
import type { Team } from '../../../db/seeds/add-workshop';
import { addDraft } from '../support/add-tank';
import { boxDesign } from '../support/box-design';
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

const read = (tankId: string) =>
  callApi(house, 'GET', `/api/v1/tanks/${tankId}/design`, { cookie });
const save = (tankId: string, design: unknown, etag: string | null, who = cookie) =>
  callApi(house, 'PUT', `/api/v1/tanks/${tankId}/design`, {
    cookie: who,
    json: design,
    headers: etag === null ? {} : { 'if-match': etag },
  });

it('saves over the version that was read, and gives the next', async () => {
  const { tank } = await addDraft(house, team);
  const before = await read(tank.id);
  expect(await before.json()).toEqual(boxDesign());
  const first = before.headers.get('etag')!;
  expect(first).toMatch(/^"[^"]+"$/);

  const saved = await save(tank.id, boxDesign(800), first);
  expect(saved.status).toBe(200);
  expect(await saved.json()).toEqual(boxDesign(800));
  expect(saved.headers.get('etag')).not.toBe(first);
  const after = await read(tank.id);
  expect(after.headers.get('etag')).toBe(saved.headers.get('etag'));
  expect(await after.json()).toEqual(boxDesign(800));
});

it('gives a new version also when nothing differs', async () => {
  const { tank } = await addDraft(house, team);
  const saved = await save(tank.id, boxDesign(), '"1"');
  expect(saved.headers.get('etag')).toBe('"2"');
});

it('answers 428 without If-Match and to *, and keeps nothing', async () => {
  const { tank } = await addDraft(house, team);
  for (const etag of [null, '', '*']) {
    const response = await save(tank.id, boxDesign(800), etag);
    expect(response.status).toBe(428);
    expect((await response.json()).code).toBe('precondition-required');
  }
  expect(await (await read(tank.id)).json()).toEqual(boxDesign());
});

it('answers 412 with what was saved meanwhile', async () => {
  const { tank } = await addDraft(house, team);
  const managers = await cookieOf(house, team.manager);
  expect((await save(tank.id, boxDesign(900), '"1"', managers)).status).toBe(200);
  const late = await save(tank.id, boxDesign(800), '"1"');
  expect(late.status).toBe(412);
  const problem = await late.json();
  expect(problem).toMatchObject({
    code: 'precondition-failed',
    etag: '"2"',
    savedBy: 'manager of Tarnside Outfitters',
    design: boxDesign(900),
  });
  expect(Date.parse(problem.savedAt)).toBeGreaterThan(Date.now() - 60_000);
  expect(late.headers.get('etag')).toBe('"2"');
  expect(await (await read(tank.id)).json()).toEqual(boxDesign(900));
});

it('takes no weak and no unknown tag', async () => {
  const { tank } = await addDraft(house, team);
  for (const etag of ['W/"1"', '"0"', '1', '"1', '"001"', 'nonsense']) {
    expect((await save(tank.id, boxDesign(800), etag)).status).toBe(412);
  }
  expect((await save(tank.id, boxDesign(800), '"7", "1"')).status).toBe(200);
});

it('loses no save of six editors who save as fast as they can', async () => {
  const { tank } = await addDraft(house, team);
  const editors = 6;
  const saves = 5;
  let refused = 0;
  const edit = async (editor: number) => {
    for (let done = 0; done < saves;) {
      const current = await read(tank.id);
      const design = (await current.json()) as TankDocument;
      const mine = { ...design.solids[0]!, id: `e${editor}-${done}` };
      const next = { ...design, solids: [...design.solids, mine] };
      const response = await save(tank.id, next, current.headers.get('etag')!);
      if (response.status === 200) done += 1;
      else refused += 1;
      expect([200, 412]).toContain(response.status);
    }
  };
  await Promise.all(Array.from({ length: editors }, (_, editor) => edit(editor)));
  const design = (await (await read(tank.id)).json()) as TankDocument;
  // every accepted save is in the document, and each raised the version by one
  expect(design.solids).toHaveLength(1 + editors * saves);
  expect((await read(tank.id)).headers.get('etag')).toBe(`"${1 + editors * saves}"`);
  expect(refused).toBeGreaterThan(0);
});

it('refuses a document that does not fit, with pointers, and keeps the draft', async () => {
  const { tank } = await addDraft(house, team);
  const broken = {
    ...boxDesign(),
    solids: [{ ...boxDesign().solids[0], length: -5, colour: 'red' }],
  };
  const response = await save(tank.id, broken, '"1"');
  expect(response.status).toBe(422);
  const pointers = (await response.json()).errors.map(
    ({ pointer }: { pointer: string }) => pointer,
  );
  expect(pointers).toContain('/solids/0/length');
  expect(pointers).toContain('/solids/0/colour');
  expect(await (await read(tank.id)).json()).toEqual(boxDesign());
});
