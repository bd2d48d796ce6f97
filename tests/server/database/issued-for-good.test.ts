import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Team } from '../../../db/seeds/add-workshop';
import { addIssuedTank, type Made } from '../support/add-tank';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let house: House;
let ours: Team;
let theirs: Team;
let made: Made;
let other: Made;
beforeAll(async () => {
  house = await openHouse();
  ours = await addTestWorkshop(house, 'Tarnside Outfitters');
  theirs = await addTestWorkshop(house, 'Fellfoot Boats');
  made = await addIssuedTank(house, ours);
  other = await addIssuedTank(house, theirs);
});
afterAll(() => house.drop());

const run = (statement: string, values: readonly unknown[] = []) =>
  house.database.sequelize.query(statement, { replacements: [...values] });

describe('the database itself refuses to change what was issued', () => {
  it.each([
    ['UPDATE revisions SET capacity_l = 1 WHERE id = ?'],
    ['UPDATE revisions SET note = note WHERE id = ?'],
    ['DELETE FROM revisions WHERE id = ?'],
    ['UPDATE strapping_rows SET volume_l = 1 WHERE revision_id = ?'],
    ['DELETE FROM strapping_rows WHERE revision_id = ?'],
    [
      'REPLACE INTO strapping_rows SELECT revision_id, row_no, 1, 1, 1, 1, 0 FROM strapping_rows WHERE revision_id = ?',
    ],
  ])('%s', async (statement) => {
    await expect(run(statement, [made.revision.id])).rejects.toThrow(
      'What was issued is never changed or removed.',
    );
  });

  it('and a second revision under the same number', async () => {
    await expect(
      run(
        `INSERT INTO revisions SELECT UUID(), workshop_id, tank_id, number, letter, design, settings, content_hash,
           step_mm, height_mm, level_per_reading, capacity_l, error_l, row_count, hash, note, issued_by,
           issued_at, brim_plus_minus_l FROM revisions WHERE id = ?`,
        [made.revision.id],
      ),
    ).rejects.toMatchObject({ name: 'SequelizeUniqueConstraintError' });
  });
});

describe('the database itself refuses a link into another workshop', () => {
  const now = new Date();
  const id = '01890000-0000-7000-8000-000000000001';
  const foreign = { name: 'SequelizeForeignKeyConstraintError' };

  it('a tank in their installation', async () => {
    const statement = 'UPDATE tanks SET installation_id = ? WHERE id = ?';
    await expect(run(statement, [other.installationId, made.tank.id])).rejects.toMatchObject(
      foreign,
    );
  });

  it('a tank moved into their workshop', async () => {
    const statement = 'UPDATE tanks SET workshop_id = ? WHERE id = ?';
    await expect(run(statement, [theirs.owner.workshopId, made.tank.id])).rejects.toMatchObject(
      foreign,
    );
  });

  it('a draft of their tank, or saved by one of them', async () => {
    const move = 'UPDATE drafts SET workshop_id = ? WHERE tank_id = ?';
    await expect(run(move, [theirs.owner.workshopId, made.tank.id])).rejects.toMatchObject(foreign);
    const sign = 'UPDATE drafts SET saved_by = ? WHERE tank_id = ?';
    await expect(run(sign, [theirs.designer.userId, made.tank.id])).rejects.toMatchObject(foreign);
  });

  it('our tank handed over to one of them', async () => {
    const statement =
      'INSERT INTO handovers (tank_id, user_id, workshop_id, handed_over_by, handed_over_at) VALUES (?, ?, ?, ?, ?)';
    const { workshopId } = ours.owner;
    const values = [made.tank.id, theirs.owner.userId, workshopId, ours.fitter.userId, now];
    await expect(run(statement, values)).rejects.toMatchObject(foreign);
  });

  it('a reading of our tank by their revision, and by another tank’s', async () => {
    const statement = `INSERT INTO readings (id, workshop_id, tank_id, revision_id, idempotency_key, body_hash, taken_at,
      depth_mm, volume_l, usable_l, room_l, mass_kg, plus_minus_l, recorded_by, recorded_at)
      VALUES (?, ?, ?, ?, 'k', 'h', ?, 1, 1, 1, 1, 1, 1, ?, ?)`;
    const { workshopId, userId } = ours.fitter;
    const values = (revisionId: string) => [
      id,
      workshopId,
      made.tank.id,
      revisionId,
      now,
      userId,
      now,
    ];
    await expect(run(statement, values(other.revision.id))).rejects.toMatchObject(foreign);
    const second = await addIssuedTank(house, ours, { name: 'Second' });
    await expect(run(statement, values(second.revision.id))).rejects.toMatchObject(foreign);
    await run(statement, values(made.revision.id));
  });

  it('a session in a workshop that the person is no member of', async () => {
    const statement =
      'INSERT INTO sessions (token_hash, workshop_id, user_id, created_at, expires_at, ends_at) VALUES (?, ?, ?, ?, ?, ?)';
    const values = ['h'.repeat(64), theirs.owner.workshopId, ours.owner.userId, now, now, now];
    await expect(run(statement, values)).rejects.toMatchObject(foreign);
  });
});
