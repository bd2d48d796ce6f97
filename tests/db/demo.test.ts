import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Tank } from '~/domain/tank/tank';
import { createComputePool, type ComputePool } from '~/server/jobs/compute-pool';
import { listReadings } from '~/server/services/list-readings';
import { listRevisions } from '~/server/services/list-revisions';
import { listTanks } from '~/server/services/list-tanks';
import { lookUpDepth } from '~/server/services/look-up-depth';
import { lookUpVolume } from '~/server/services/look-up-volume';
import { readTable } from '~/server/services/read-table';
import { signIn } from '~/server/services/sign-in';
import type { Team } from '../../db/seeds/add-workshop';
import { demoPassword, seedDemo } from '../../db/seeds/demo';
import { once } from '../../db/seeds/once';
import { openHouse, type House } from '../server/support/house';

let house: House;
let pool: ComputePool;
let team: Team;
let tanks: Map<string, Tank>;
beforeAll(async () => {
  pool = createComputePool({ threads: 1 });
  house = await openHouse({ computePool: pool });
  // broken off once: the third table fails, as if the machine had gone down
  let issues = 0;
  const failing: ComputePool = {
    ...pool,
    issue: (...of) =>
      (issues += 1) === 3 ? Promise.reject(new Error('power cut')) : pool.issue(...of),
  };
  const context = { ...house.context, computePool: failing };
  await expect(once(context, 'demo', seedDemo)).rejects.toThrow('power cut');
  expect(await once(house.context, 'demo', async (whole) => (team = await seedDemo(whole)))).toBe(
    true,
  );
  tanks = new Map((await listTanks(house.context, team.manager)).map((tank) => [tank.name, tank]));
}, 120_000);
afterAll(async () => {
  await house.drop();
  await pool.close();
});

const revisionOf = (name: string) => tanks.get(name)!.revision!.id;
const at = (name: string, depthMm: number) =>
  lookUpVolume(house.context, team.owner, { revisionId: revisionOf(name), depthMm });

describe('the demo workshop', () => {
  it('is put in once', async () => {
    expect(await once(house.context, 'demo', () => Promise.reject(new Error('again')))).toBe(false);
  });

  it('has its people, each with the same password', async () => {
    for (const role of ['manager', 'designer', 'fitter', 'owner'] as const) {
      const input = { email: `${role}@tarnside.example`, password: demoPassword };
      expect((await signIn(house.context, null, input)).setCookie).toContain('dipwright=');
      expect(team[role]).toMatchObject({ role, workshopName: 'Tarnside Outfitters' });
    }
  });

  it('has its tanks, each once, with the revisions they came to', async () => {
    const letters = [...tanks].map(([name, { revision }]) => [name, revision?.letter ?? null]);
    expect(Object.fromEntries(letters)).toEqual({
      'Drinking water cistern': 'A',
      'Fresh water': null,
      'Grey water': 'A',
      'Heating oil': 'A',
      'Port diesel tank': 'B',
    });
    for (const table of ['workshops', 'installations', 'tanks']) {
      const rows = await house.sql(`SELECT id FROM ${table}`);
      expect(rows).toHaveLength({ workshops: 1, installations: 4, tanks: 5 }[table]!);
    }
    const tankId = tanks.get('Port diesel tank')!.id;
    const revisions = await listRevisions(house.context, team.fitter, { tankId });
    expect(revisions.map(({ letter }) => letter)).toEqual(['B', 'A']);
  });

  it('shows the owner the three tanks that were handed over', async () => {
    const seen = await listTanks(house.context, team.owner);
    expect(seen.map(({ name }) => name)).toEqual([
      'Drinking water cistern',
      'Heating oil',
      'Port diesel tank',
    ]);
    const tankId = tanks.get('Drinking water cistern')!.id;
    const readings = await listReadings(house.context, team.owner, { tankId });
    expect(readings.map(({ depthMm }) => depthMm)).toEqual([150, 174, 231, 296]);
    expect(new Set(readings.map(({ at }) => at)).size).toBe(4);
  });

  it('has tables that match their hashes', async () => {
    for (const { revision } of tanks.values()) {
      if (revision === null) continue;
      const table = await readTable(house.context, team.fitter, { revisionId: revision.id });
      expect(table.rows.length).toBeGreaterThan(30);
    }
  });
});

describe('look-ups against closed forms', () => {
  // floor rising 60 mm over 800: V = 0.05 h + h²/300 up to 60 mm, 15 + 0.45 (h − 60) above
  it('box with a sloped floor', async () => {
    const litres = (h: number) => (h <= 60 ? 0.05 * h + (h * h) / 300 : 15 + 0.45 * (h - 60));
    for (const depthMm of [0, 7.3, 30, 59.9, 60, 93.7, 150, 299.99, 300]) {
      const { volumeL, ullageMm, plusMinusL } = await at('Drinking water cistern', depthMm);
      expect(volumeL).toBeCloseTo(litres(depthMm), 4);
      expect(ullageMm).toBeCloseTo(300 - depthMm, 9);
      expect(plusMinusL).toBeGreaterThan(0);
    }
    expect((await at('Drinking water cistern', 150)).usableL).toBeCloseTo(55.5, 4);
    expect((await at('Drinking water cistern', 150)).massKg).toBeCloseTo(55.5 * 0.998, 4);
  });

  // V = 0.00072 h² litres; brim 180, safe fill 171, unusable 0.00072 × 40² = 1.152
  it('V hull, with outlet and safe fill', async () => {
    for (const depthMm of [0, 3.3, 40, 123.4, 250, 487.3, 500]) {
      const volume = 0.00072 * depthMm ** 2;
      const found = await at('Port diesel tank', depthMm);
      expect(found.volumeL).toBeCloseTo(volume, 4);
      expect(found.usableL).toBeCloseTo(Math.max(0, volume - 1.152), 4);
      expect(found.roomL).toBeCloseTo(Math.max(0, 171 - volume), 4);
      expect(found.massKg).toBeCloseTo(volume * 0.84, 4);
      expect(found).toMatchObject({ revision: 'B', current: true });
    }
    for (const [volumeL, depthMm] of [
      [90, 353.553],
      [100, 372.678],
      [171, 487.34],
    ] as const) {
      const found = await lookUpDepth(house.context, team.owner, {
        revisionId: revisionOf('Port diesel tank'),
        volumeL,
      });
      expect(found.depthMm).toBeCloseTo(depthMm, 2);
      expect(found.plusMinusMm).toBeGreaterThan(0);
    }
    const empty = await lookUpDepth(house.context, team.owner, {
      revisionId: revisionOf('Port diesel tank'),
      volumeL: 0,
    });
    expect(empty.depthMm).toBeCloseTo(0, 6);
    // at the keel the ± of the litres is small, and so many millimetres is √(± / 0.00072)
    const { plusMinusL } = await at('Port diesel tank', 0);
    expect(empty.plusMinusMm).toBeCloseTo(Math.sqrt(plusMinusL / 0.00072), 1);
    expect(empty.plusMinusMm).toBeLessThan(20);
  });

  // circular segment: R² acos((R − h)/R) − (R − h) √(2Rh − h²), times the length
  it('lying cylinder', async () => {
    const radius = 600;
    const litres = (h: number) =>
      ((radius ** 2 * Math.acos((radius - h) / radius) -
        (radius - h) * Math.sqrt(2 * radius * h - h * h)) *
        2000) /
      1e6;
    for (const depthMm of [50, 141.6, 419.1, 600, 804.7, 1117, 1150]) {
      // between rows the curve is good to 3e-8 of capacity, and the mesh to 6e-7
      expect(Math.abs((await at('Heating oil', depthMm)).volumeL - litres(depthMm))).toBeLessThan(
        2e-6 * 2261.9,
      );
    }
    const dip = await at('Heating oil', 419.1);
    expect(dip.volumeL).toBeCloseTo(703.5, 1);
    // room to 97 % of 2261.9 L
    expect(dip.roomL).toBeCloseTo(0.97 * 2261.947 - dip.volumeL, 2);
    expect(dip.roomL).toBeGreaterThan(1490);
  });

  it('the space above the liquid is the same question from the other end', async () => {
    const revisionId = revisionOf('Drinking water cistern');
    const byDepth = await lookUpVolume(house.context, team.owner, { revisionId, depthMm: 135 });
    const byUllage = await lookUpVolume(house.context, team.owner, { revisionId, ullageMm: 165 });
    expect(byUllage).toEqual(byDepth);
    expect(byDepth.volumeL).toBeCloseTo(48.75, 4);
  });
});
