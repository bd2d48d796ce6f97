import { readdirSync, readFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Actor } from '~/domain/access/actor';
import { roles, type Role } from '~/domain/access/roles';
import { chartOptions } from '~/domain/report/chart-options';
import { changeTank } from '~/server/services/change-tank';
import { createInstallation } from '~/server/services/create-installation';
import { createTank } from '~/server/services/create-tank';
import { handOverTank } from '~/server/services/hand-over-tank';
import { issueRevision } from '~/server/services/issue-revision';
import { listBrims } from '~/server/services/list-brims';
import { listHandovers } from '~/server/services/list-handovers';
import { listInstallations } from '~/server/services/list-installations';
import { listMembers } from '~/server/services/list-members';
import { listReadings } from '~/server/services/list-readings';
import { listRevisions } from '~/server/services/list-revisions';
import { listTankOverviews } from '~/server/services/list-tank-overviews';
import { listTanks } from '~/server/services/list-tanks';
import { lookUpDepth } from '~/server/services/look-up-depth';
import { lookUpVolume } from '~/server/services/look-up-volume';
import { readDraft } from '~/server/services/read-draft';
import { readRevision } from '~/server/services/read-revision';
import { readTable } from '~/server/services/read-table';
import { readTank } from '~/server/services/read-tank';
import { readTankCard } from '~/server/services/read-tank-card';
import { readWorkshop } from '~/server/services/read-workshop';
import { recordReading } from '~/server/services/record-reading';
import { renderChart } from '~/server/services/render-chart';
import { saveDraft } from '~/server/services/save-draft';
import { readMesh } from '~/server/services/read-mesh';
import { uploadMesh } from '~/server/services/upload-mesh';
import type { Team } from '../../../db/seeds/add-workshop';
import { asBinaryStl, boxMesh } from '../../geometry/mesh-import/mesh-files';
import { addDraft, addIssuedTank, type Made } from '../support/add-tank';
import { boxDesign } from '../support/box-design';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let house: House;
let team: Team;
let made: Made;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
  made = await addIssuedTank(house, team);
});
afterAll(() => house.drop());

interface Row {
  roles: readonly Role[];
  run(actor: Actor): Promise<unknown>;
}

async function* sentBox() {
  yield asBinaryStl(boxMesh([900, 500, 300]));
}

const everyone: readonly Role[] = ['manager', 'designer', 'fitter', 'owner'];
const designers: readonly Role[] = ['manager', 'designer'];
const builders: readonly Role[] = ['manager', 'designer', 'fitter'];
const fitters: readonly Role[] = ['manager', 'fitter'];
const tankId = () => made.tank.id;
const revisionId = () => made.revision.id;
const context = () => house.context;

/** Who may do what, written out beside the permission map and not taken from it. */
const matrix: Record<string, Row> = {
  readWorkshop: { roles: everyone, run: (actor) => readWorkshop(context(), actor) },
  listMembers: { roles: fitters, run: (actor) => listMembers(context(), actor) },
  listInstallations: { roles: everyone, run: (actor) => listInstallations(context(), actor) },
  createInstallation: {
    roles: builders,
    run: (actor) => createInstallation(context(), actor, { name: 'Van', kind: 'vehicle' }),
  },
  listTanks: { roles: everyone, run: (actor) => listTanks(context(), actor) },
  listTankOverviews: { roles: builders, run: (actor) => listTankOverviews(context(), actor) },
  listBrims: { roles: everyone, run: (actor) => listBrims(context(), actor, { tankId: tankId() }) },
  readTank: { roles: everyone, run: (actor) => readTank(context(), actor, { tankId: tankId() }) },
  readTankCard: {
    roles: everyone,
    run: (actor) => readTankCard(context(), actor, { tankId: tankId() }),
  },
  createTank: {
    roles: designers,
    run: (actor) =>
      createTank(context(), actor, {
        installationId: made.installationId,
        name: 'New',
        liquid: 'diesel',
      }),
  },
  changeTank: {
    roles: designers,
    run: (actor) =>
      changeTank(context(), actor, { tankId: tankId(), change: { safeFillPercent: 90 } }),
  },
  readDraft: { roles: builders, run: (actor) => readDraft(context(), actor, { tankId: tankId() }) },
  saveDraft: {
    roles: designers,
    run: async (actor) => {
      const { tank } = await addDraft(house, team);
      return saveDraft(context(), actor, {
        tankId: tank.id,
        etags: ['"1"'],
        design: boxDesign(700),
      });
    },
  },
  uploadMesh: {
    roles: designers,
    run: (actor) => uploadMesh(context(), actor, { unit: 'mm', name: 'Shell', sent: sentBox() }),
  },
  readMesh: {
    roles: builders,
    run: async (actor) => {
      const sent = { unit: 'mm', name: 'Shell', sent: sentBox() } as const;
      const { id } = await uploadMesh(context(), team.designer, sent);
      return readMesh(context(), actor, { meshId: id });
    },
  },
  issueRevision: {
    roles: designers,
    run: async (actor) => {
      const { tank } = await addDraft(house, team);
      return issueRevision(context(), actor, { tankId: tank.id, stepMm: 10 });
    },
  },
  listRevisions: {
    roles: everyone,
    run: (actor) => listRevisions(context(), actor, { tankId: tankId() }),
  },
  readRevision: {
    roles: everyone,
    run: (actor) => readRevision(context(), actor, { revisionId: revisionId() }),
  },
  readTable: {
    roles: everyone,
    run: (actor) => readTable(context(), actor, { revisionId: revisionId() }),
  },
  lookUpVolume: {
    roles: everyone,
    run: (actor) => lookUpVolume(context(), actor, { revisionId: revisionId(), depthMm: 100 }),
  },
  lookUpDepth: {
    roles: everyone,
    run: (actor) => lookUpDepth(context(), actor, { revisionId: revisionId(), volumeL: 50 }),
  },
  renderChart: {
    roles: everyone,
    run: (actor) =>
      renderChart(context(), actor, { revisionId: revisionId(), options: chartOptions.parse({}) }),
  },
  handOverTank: {
    roles: fitters,
    run: (actor) => handOverTank(context(), actor, { tankId: tankId(), userId: team.owner.userId }),
  },
  listHandovers: {
    roles: fitters,
    run: (actor) => listHandovers(context(), actor, { tankId: tankId() }),
  },
  recordReading: {
    roles: ['manager', 'fitter', 'owner'],
    run: (actor) =>
      recordReading(context(), actor, {
        tankId: tankId(),
        idempotencyKey: `by-${actor.role}`,
        reading: { at: '2026-11-30T08:15:00Z', depthMm: 120 },
      }),
  },
  listReadings: {
    roles: everyone,
    run: (actor) => listReadings(context(), actor, { tankId: tankId() }),
  },
};

/** Done before anybody is known, for nobody in particular, or by the server itself. */
const withoutRole = ['signUp', 'signIn', 'signOut', 'computeTable', 'checkReadiness', 'tidy'];

describe.each(Object.entries(matrix))('%s', (_name, row) => {
  it.each(roles)('as %s', async (role) => {
    const doing = row.run(team[role]);
    if (row.roles.includes(role)) await expect(doing).resolves.not.toThrow();
    else await expect(doing).rejects.toMatchObject({ code: 'forbidden' });
  });
});

it('has a row for every use case', () => {
  const folder = 'src/server/services';
  const found = readdirSync(folder).flatMap((file) => {
    const source = readFileSync(`${folder}/${file}`, 'utf8');
    return [...source.matchAll(/export async function (\w+)\(\s*_?context\b/g)].map(
      (match) => match[1]!,
    );
  });
  expect(found.length).toBeGreaterThan(20);
  expect([...found].sort()).toEqual([...Object.keys(matrix), ...withoutRole].sort());
});
