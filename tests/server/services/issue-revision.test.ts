import { computePreview } from '~/domain/table/compute-preview';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DipwrightError } from '~/domain/errors';
import type { TankDocument } from '~/domain/tank/document';
import { printedRows } from '~/domain/table/printed-rows';
import { createComputePool, type ComputePool } from '~/server/jobs/compute-pool';
import { changeTank } from '~/server/services/change-tank';
import { issueRevision } from '~/server/services/issue-revision';
import { levelPerReading } from '~/server/services/level-per-reading';
import { listRevisions } from '~/server/services/list-revisions';
import { listBrims } from '~/server/services/list-brims';
import { lookUpDepth } from '~/server/services/look-up-depth';
import { lookUpVolume } from '~/server/services/look-up-volume';
import { readTable } from '~/server/services/read-table';
import { readTankCard } from '~/server/services/read-tank-card';
import { readTank } from '~/server/services/read-tank';
import { revisionHash } from '~/server/services/revision-hash';
import { saveDraft } from '~/server/services/save-draft';
import type { Team } from '../../../db/seeds/add-workshop';
import { addDraft } from '../support/add-tank';
import { boxDesign } from '../support/box-design';
import { boxPool } from '../support/box-pool';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let house: House;
let team: Team;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
});
afterAll(() => house.drop());

const issue = (tankId: string, stepMm = 10, context = house.context) =>
  issueRevision(context, team.designer, { tankId, stepMm });
const withPool = (pool: Partial<ComputePool>) => ({
  ...house.context,
  computePool: { ...boxPool(), ...pool },
});
const kept = async (tankId: string) => ({
  revisions: (await house.sql('SELECT id FROM revisions WHERE tank_id = ?', [tankId])).length,
  rows: (
    await house.sql(
      'SELECT row_no FROM strapping_rows s JOIN revisions r ON r.id = s.revision_id WHERE r.tank_id = ?',
      [tankId],
    )
  ).length,
});

describe('what is issued', () => {
  it('is frozen with every row, bit for bit', async () => {
    const { tank } = await addDraft(house, team, { design: boxDesign(333.3, 77.7, 101.1) });
    const revision = await issue(tank.id, 0.7);
    const table = await readTable(house.context, team.fitter, { revisionId: revision.id });
    const computed = await boxPool().issue(boxDesign(333.3, 77.7, 101.1), tank.settings, 0.7);
    expect(table.rows).toEqual(printedRows(computed.rows));
    expect(Object.keys(table.rows[0]!)).toEqual(['depthMm', 'volumeL', 'surfaceCm2', 'plusMinusL']);
    expect(table.revision).toEqual(revision);
    expect(revision.hash).toMatch(/^[0-9a-f]{64}$/);
  });

  it('runs through the letters', async () => {
    const { tank } = await addDraft(house, team);
    const letters = [];
    for (const stepMm of [10, 20, 30]) letters.push((await issue(tank.id, stepMm)).letter);
    expect(letters).toEqual(['A', 'B', 'C']);
    const all = await listRevisions(house.context, team.owner, { tankId: tank.id }).catch(
      () => null,
    );
    expect(all).toBeNull();
    const seen = await listRevisions(house.context, team.fitter, { tankId: tank.id });
    expect(seen.map(({ letter, current }) => [letter, current])).toEqual([
      ['C', true],
      ['B', false],
      ['A', false],
    ]);
  });

  it('keeps its settings when the tank’s are changed', async () => {
    const { tank } = await addDraft(house, team, { settings: { outletMm: 40 } });
    const tankId = tank.id;
    await issue(tankId);
    await changeTank(house.context, team.designer, { tankId, change: { outletMm: 60 } });
    const rows = await house.sql<{ settings: string }>(
      'SELECT settings FROM revisions WHERE tank_id = ?',
      [tankId],
    );
    expect(JSON.parse(rows[0]!.settings).outletMm).toBe(40);
    expect((await readTank(house.context, team.designer, { tankId })).draftDiffers).toBe(true);
  });
});

describe('is refused', () => {
  it('when nothing has changed, with the letter that stands', async () => {
    const { tank } = await addDraft(house, team);
    await issue(tank.id);
    await expect(issue(tank.id)).rejects.toMatchObject({
      code: 'conflict',
      message: 'Nothing has changed since revision A: shape, settings and step are the same.',
    });
    // the same design with its keys in another order is the same design
    const { stick: _none, ...design } = { stick: null, ...boxDesign() };
    const turned = Object.fromEntries(Object.entries(design).reverse()) as typeof design;
    await saveDraft(house.context, team.designer, {
      tankId: tank.id,
      etags: ['"1"'],
      design: turned,
    });
    await expect(issue(tank.id)).rejects.toMatchObject({ code: 'conflict' });
    expect((await kept(tank.id)).revisions).toBe(1);
  });

  it('when the draft moves on while the table is computed', async () => {
    const { tank } = await addDraft(house, team);
    const context = withPool({
      async issue(design, settings, stepMm) {
        await saveDraft(house.context, team.manager, {
          tankId: tank.id,
          etags: ['"1"'],
          design: boxDesign(700),
        });
        return boxPool().issue(design, settings, stepMm);
      },
    });
    await expect(issue(tank.id, 10, context)).rejects.toMatchObject({ code: 'conflict' });
    expect(await kept(tank.id)).toEqual({ revisions: 0, rows: 0 });
  });

  it('when the outlet stands above the stick', async () => {
    const { tank } = await addDraft(house, team, { settings: { outletMm: 301 } });
    await expect(issue(tank.id)).rejects.toMatchObject({
      code: 'invalid',
      faults: [{ pointer: '/settings/outletMm' }],
    });
    expect(await kept(tank.id)).toEqual({ revisions: 0, rows: 0 });
  });

  it('with the pool’s reasons', async () => {
    const { tank } = await addDraft(house, team);
    const refusal = new DipwrightError('invalid', 'The liquid space is in 2 pieces.', {
      faults: [{ pointer: '/design/solids', detail: 'The liquid space is in 2 pieces.' }],
    });
    const context = withPool({ issue: () => Promise.reject(refusal) });
    await expect(issue(tank.id, 10, context)).rejects.toBe(refusal);
    expect(await kept(tank.id)).toEqual({ revisions: 0, rows: 0 });
  });
});

describe('all or nothing', () => {
  it('a row that cannot be written takes everything back', async () => {
    const { tank } = await addDraft(house, team, { design: boxDesign(1000, 500, 1500) });
    const context = withPool({
      async issue(design, settings, stepMm) {
        const table = await boxPool().issue(design, settings, stepMm);
        // the second thousand of rows fails: the first has been sent by then
        const rows = table.rows.map((row, index) =>
          index === 1200 ? { ...row, volumeL: Number.NaN } : row,
        );
        return { ...table, rows };
      },
    });
    await expect(issue(tank.id, 1, context)).rejects.toThrow();
    expect(await kept(tank.id)).toEqual({ revisions: 0, rows: 0 });
    expect((await issue(tank.id, 1)).letter).toBe('A');
    expect(await kept(tank.id)).toEqual({ revisions: 1, rows: 1501 });
  });

  it('five who issue at once make one revision', async () => {
    const { tank } = await addDraft(house, team);
    const outcomes = await Promise.allSettled(Array.from({ length: 5 }, () => issue(tank.id)));
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    for (const outcome of outcomes) {
      if (outcome.status === 'rejected') expect(outcome.reason).toMatchObject({ code: 'conflict' });
    }
    expect(await kept(tank.id)).toEqual({ revisions: 1, rows: 31 });
  });

  it('five who issue different steps at once get five letters', async () => {
    const { tank } = await addDraft(house, team);
    const revisions = await Promise.all(
      [5, 10, 15, 20, 30].map((stepMm) => issue(tank.id, stepMm)),
    );
    expect(revisions.map(({ letter }) => letter).sort()).toEqual(['A', 'B', 'C', 'D', 'E']);
  });
});

describe('what the database holds is checked before it is given out', () => {
  it('a row changed behind the program’s back is noticed', async () => {
    const { tank } = await addDraft(house, team);
    const revision = await issue(tank.id);
    await house.database.sequelize.query('DROP TRIGGER strapping_rows_refuse_update');
    await house.database.sequelize.query(
      'UPDATE strapping_rows SET volume_l = volume_l + 0.001 WHERE revision_id = ? AND row_no = 7',
      { replacements: [revision.id] },
    );
    await expect(
      readTable(house.context, team.fitter, { revisionId: revision.id }),
    ).rejects.toThrow(/does not match its hash/);
  });
});

const lyingCylinder: TankDocument = {
  ...boxDesign(),
  solids: [{ id: 'barrel', role: 'holds', kind: 'cylinder', diameter: 500, length: 1000 }],
};
function segment(r: number, h: number): number {
  return r * r * Math.acos((r - h) / r) - (r - h) * Math.sqrt(2 * r * h - h * h);
}

describe('with the real engine', () => {
  const pool = createComputePool({ threads: 1 });
  afterAll(() => pool.close());

  it('refuses a shape in two pieces, and keeps nothing', async () => {
    const design = boxDesign();
    const apart = {
      ...design.solids[0]!,
      id: 'apart',
      at: [5000, 0, 0] as [number, number, number],
    };
    const { tank } = await addDraft(house, team, {
      design: { ...design, solids: [...design.solids, apart] },
    });
    const context = { ...house.context, computePool: pool };
    await expect(issue(tank.id, 10, context)).rejects.toMatchObject({ code: 'invalid' });
    expect(await kept(tank.id)).toEqual({ revisions: 0, rows: 0 });
  });

  it('keeps closer rows where a curve needs them: look-ups use them, tables and files leave them out', async () => {
    const design = lyingCylinder;
    const { tank } = await addDraft(house, team, { design });
    const context = { ...house.context, computePool: pool };
    const revision = await issue(tank.id, 5, context);
    const { rows } = await readTable(context, team.fitter, { revisionId: revision.id });
    expect(rows.map(({ depthMm }) => depthMm)).toEqual(
      Array.from({ length: 101 }, (_, i) => 5 * i),
    );
    const stored = await kept(tank.id);
    expect(stored.rows).toBeGreaterThan(101);
    expect(stored.rows).toBeLessThan(101 + 20);

    // the segment of a circle: r² acos((r−h)/r) − (r−h) √(2rh−h²), here in the first 5 mm
    for (const depthMm of [0.05, 0.7, 2.5, 4.1, 497.5]) {
      const answer = await lookUpVolume(context, team.fitter, { revisionId: revision.id, depthMm });
      const exact = (segment(250, depthMm) * 1000) / 1e6;
      expect(Math.abs(answer.volumeL - exact) / revision.capacityL).toBeLessThan(1e-6);
      const back = await lookUpDepth(context, team.fitter, {
        revisionId: revision.id,
        volumeL: exact,
      });
      expect(Math.abs(back.depthMm - depthMm)).toBeLessThan(0.02);
    }
    const card = (await readTankCard(context, team.fitter, { tankId: tank.id }))!;
    expect(card.rows.length).toBe(stored.rows);
    expect(card.rows.filter(({ betweenRows }) => betweenRows).length).toBe(stored.rows - 101);
  });

  it('reads a revision from before there were closer rows as it was issued', async () => {
    const { tank } = await addDraft(house, team, { design: lyingCylinder });
    const settings = (await readTank(house.context, team.fitter, { tankId: tank.id })).settings;
    const computed = await pool.issue(lyingCylinder, settings, 5);
    const rows = computed.rows.filter(({ betweenRows }) => !betweenRows);
    // as an older program wrote it: no row between, nothing frozen of the brim, the hash of its time
    const before = withPool({
      issue: () => Promise.resolve({ ...computed, rows, brimPlusMinusL: null as never }),
    });
    const revision = await issue(tank.id, 5, before);
    expect(revision.hash).toBe(revisionHash(lyingCylinder, settings, rows, null));
    const read = await readTable(house.context, team.fitter, { revisionId: revision.id });
    expect(read.rows).toEqual(printedRows(rows));
    const top = rows.at(-1)!.plusMinusL;
    const brims = await listBrims(house.context, team.fitter, { tankId: tank.id });
    expect(brims.get(revision.id)).toBe(top);
    const card = await readTankCard(house.context, team.fitter, { tankId: tank.id });
    expect(card?.brimPlusMinusL).toBe(top);
  });

  it('freezes the ± of the brim and of single sizes', async () => {
    const own = { 'body/length': 0.5, 'gone/length': 3 };
    const { tank } = await addDraft(house, team, { settings: { ownSizePlusMinusMm: own } });
    const context = { ...house.context, computePool: pool };
    const revision = await issue(tank.id, 10, context);
    const frozen = await house.sql<{ settings: string; brim: number }>(
      'SELECT settings, brim_plus_minus_l AS brim FROM revisions WHERE id = ?',
      [revision.id],
    );
    expect(JSON.parse(frozen[0]!.settings).ownSizePlusMinusMm).toEqual(own);
    // 1000 × 500 × 300 with ± 0.5, 2, 2 mm and no dip
    const expected = Math.hypot(500 * 300 * 0.5, 1000 * 300 * 2, 1000 * 500 * 2) / 1e6;
    expect(frozen[0]!.brim).toBeCloseTo(expected, 6);
    const brims = await listBrims(context, team.fitter, { tankId: tank.id });
    expect(brims.get(revision.id)).toBe(frozen[0]!.brim);

    const without = await changeTank(context, team.designer, {
      tankId: tank.id,
      change: { ownSizePlusMinusMm: {} },
    });
    expect(without.settings).not.toHaveProperty('ownSizePlusMinusMm');
    expect(without.draftDiffers).toBe(true);
    const again = await changeTank(context, team.designer, {
      tankId: tank.id,
      change: { ownSizePlusMinusMm: { 'gone/length': 3, 'body/length': 0.5 } },
    });
    expect(again.settings.ownSizePlusMinusMm).toEqual(own);
    expect(again.draftDiffers).toBe(false);
  });

  it('freezes the same share of a tilted stick as the engine computes with', async () => {
    const design = {
      ...boxDesign(),
      attitude: { pitch: 5, roll: -3 },
      stick: { at: [500, 250] as [number, number] },
    };
    const { frame } = await computePreview(design);
    expect(levelPerReading(design)).toBeCloseTo(frame.levelPerReading, 14);
    const { tank } = await addDraft(house, team, { design });
    const context = { ...house.context, computePool: pool };
    const revision = await issue(tank.id, 10, context);
    // between rows too, where the surface meets neither floor nor roof: 0.5 L a millimetre of stick
    const look = (depthMm: number) =>
      lookUpVolume(context, team.fitter, { revisionId: revision.id, depthMm });
    const [low, high] = [await look(120), await look(133.7)];
    expect(high.volumeL - low.volumeL).toBeCloseTo(13.7 * 0.5, 6);
  });
});
