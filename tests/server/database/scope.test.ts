import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { designHashes, findDraft, replaceDraft } from '~/server/database/repositories/drafts';
import {
  isHandedOver,
  listHandoverRecords,
  tankIdsHandedOverTo,
} from '~/server/database/repositories/handovers';
import {
  findInstallation,
  listInstallationRecords,
} from '~/server/database/repositories/installations';
import { listMemberships } from '~/server/database/repositories/memberships';
import { findReadingByKey, listReadingRecords } from '~/server/database/repositories/readings';
import {
  currentRevision,
  findRevision,
  listRevisionHeads,
} from '~/server/database/repositories/revisions';
import { draftDesigns, handedOverAmong } from '~/server/database/repositories/tank-overviews';
import { findTank, listTankRecords, updateTank } from '~/server/database/repositories/tanks';
import type { Scope } from '~/server/database/scope';
import { recordReading } from '~/server/services/record-reading';
import type { Team } from '../../../db/seeds/add-workshop';
import { addIssuedTank, type Made } from '../support/add-tank';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let house: House;
let ours: Team;
let made: Made;
let scopes: { ours: Scope; theirs: Scope };
beforeAll(async () => {
  house = await openHouse();
  ours = await addTestWorkshop(house);
  const theirs = await addTestWorkshop(house, 'Fellfoot Boats');
  made = await addIssuedTank(house, ours);
  const { database } = house;
  scopes = {
    ours: { database, workshopId: ours.owner.workshopId },
    theirs: { database, workshopId: theirs.owner.workshopId },
  };
  const reading = { at: '2026-11-30T08:15:00Z', depthMm: 100 };
  await recordReading(house.context, ours.owner, {
    tankId: made.tank.id,
    idempotencyKey: 'k',
    reading,
  });
});
afterAll(() => house.drop());

/** What each query finds, counted: something in the scope of the workshop, nothing in another's. */
const queries: Record<string, (scope: Scope) => Promise<unknown>> = {
  findTank: (scope) => findTank(scope, made.tank.id),
  listTankRecords: (scope) => listTankRecords(scope, [made.tank.id]),
  findInstallation: (scope) => findInstallation(scope, made.installationId),
  listInstallationRecords: (scope) => listInstallationRecords(scope, [made.installationId]),
  findDraft: (scope) => findDraft(scope, made.tank.id),
  designHashes: (scope) => designHashes(scope, [made.tank.id]),
  draftDesigns: (scope) => draftDesigns(scope, [made.tank.id]),
  findRevision: (scope) => findRevision(scope, made.revision.id),
  listRevisionHeads: (scope) => listRevisionHeads(scope, made.tank.id),
  currentRevision: (scope) => currentRevision(scope, made.tank.id),
  isHandedOver: (scope) => isHandedOver(scope, made.tank.id, ours.owner.userId),
  handedOverAmong: (scope) => handedOverAmong(scope, [made.tank.id]),
  listHandoverRecords: (scope) => listHandoverRecords(scope, made.tank.id),
  tankIdsHandedOverTo: (scope) => tankIdsHandedOverTo(scope, ours.owner.userId),
  findReadingByKey: (scope) => findReadingByKey(scope, made.tank.id, 'k'),
  listReadingRecords: (scope) => listReadingRecords(scope, made.tank.id, 10),
};

function found(what: unknown): boolean {
  if (Array.isArray(what)) return what.length > 0;
  if (what instanceof Map || what instanceof Set) return what.size > 0;
  return what !== null && what !== false;
}

describe('a query in the scope of another workshop finds nothing', () => {
  it.each(Object.keys(queries))('%s', async (name) => {
    expect(found(await queries[name]!(scopes.ours))).toBe(true);
    expect(found(await queries[name]!(scopes.theirs))).toBe(false);
  });

  it('listMemberships', async () => {
    const members = await listMemberships(scopes.theirs);
    expect(members).toHaveLength(4);
    expect(members.map(({ userId }) => userId)).not.toContain(ours.owner.userId);
  });

  it('and changes nothing', async () => {
    const before = await findTank(scopes.ours, made.tank.id);
    await updateTank(scopes.theirs, made.tank.id, { name: 'Taken' });
    expect(await findTank(scopes.ours, made.tank.id)).toEqual(before);
    const draft = (await findDraft(scopes.ours, made.tank.id))!;
    expect(await replaceDraft(scopes.theirs, made.tank.id, draft.version, draft)).toBe(false);
    expect(await findDraft(scopes.ours, made.tank.id)).toEqual(draft);
  });
});
