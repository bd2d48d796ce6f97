import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createSessions, idleDays, longestDays } from '~/server/auth/sessions';
import { tidy } from '~/server/services/keep-tidy';
import type { Team } from '../../../db/seeds/add-workshop';
import { callApi, signInAs } from '../support/call-api';
import { addTestWorkshop, openHouse, password, type House } from '../support/house';

let house: House;
let team: Team;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
});
afterAll(() => house.drop());

const dayMs = 24 * 3_600_000;
const hashOf = (cookie: string) => createHash('sha256').update(cookie.split('=')[1]!).digest('hex');
const rowOf = async (cookie: string) =>
  (
    await house.sql<{ expires_at: Date; ends_at: Date }>(
      'SELECT expires_at, ends_at FROM sessions WHERE token_hash = ?',
      [hashOf(cookie)],
    )
  )[0];
const move = (cookie: string, column: 'expires_at' | 'ends_at', to: Date) =>
  house.database.sequelize.query(`UPDATE sessions SET ${column} = ? WHERE token_hash = ?`, {
    replacements: [to, hashOf(cookie)],
  });
const me = async (cookie: string) => (await callApi(house, 'GET', '/api/v1/me', { cookie })).status;

describe('a session', () => {
  it('is kept only by the hash of its token', async () => {
    const cookie = await signInAs(house, team.designer.email, password);
    const token = cookie.split('=')[1]!;
    expect(await rowOf(cookie)).toBeDefined();
    const everything = await house.sql<Record<string, unknown>>('SELECT * FROM sessions');
    expect(JSON.stringify(everything)).not.toContain(token);
    expect(token.length).toBeGreaterThanOrEqual(32);
  });

  it('ends when it is not used', async () => {
    const cookie = await signInAs(house, team.designer.email, password);
    const row = (await rowOf(cookie))!;
    expect((row.expires_at.getTime() - Date.now()) / dayMs).toBeCloseTo(idleDays, 2);
    expect(await me(cookie)).toBe(200);
    await move(cookie, 'expires_at', new Date(Date.now() - 1000));
    expect(await me(cookie)).toBe(401);
    expect(await rowOf(cookie)).toBeUndefined();
  });

  it('is drawn out by use, but never past its last moment', async () => {
    const cookie = await signInAs(house, team.designer.email, password);
    await move(cookie, 'expires_at', new Date(Date.now() + 0.2 * idleDays * dayMs));
    expect(await me(cookie)).toBe(200);
    expect(((await rowOf(cookie))!.expires_at.getTime() - Date.now()) / dayMs).toBeCloseTo(
      idleDays,
      2,
    );

    const { ends_at } = (await rowOf(cookie))!;
    expect((ends_at.getTime() - Date.now()) / dayMs).toBeCloseTo(longestDays, 2);
    const soon = new Date(Math.floor(Date.now() / 1000) * 1000 + 3_600_000);
    await move(cookie, 'ends_at', soon);
    await move(cookie, 'expires_at', new Date(Date.now() + 1_800_000));
    expect(await me(cookie)).toBe(200);
    expect((await rowOf(cookie))!.expires_at).toEqual(soon);
  });

  it('ends at sign-out, also for whoever kept the cookie', async () => {
    const cookie = await signInAs(house, team.designer.email, password);
    const out = await callApi(house, 'DELETE', '/api/v1/session', { cookie });
    expect(out.status).toBe(204);
    expect(out.headers.get('set-cookie')).toMatch(/^dipwright=; .*Max-Age=0/);
    expect(await me(cookie)).toBe(401);
  });

  it('is a new one at sign-in, and the old one is over', async () => {
    const old = await signInAs(house, team.designer.email, password);
    const json = { email: team.designer.email, password };
    const response = await callApi(house, 'POST', '/api/v1/session', { cookie: old, json });
    const fresh = response.headers.get('set-cookie')!.split(';')[0]!;
    expect(fresh).not.toBe(old);
    expect(await me(old)).toBe(401);
    expect(await me(fresh)).toBe(200);
  });

  it('is not taken from a cookie that somebody planted', async () => {
    const planted = `dipwright=${'a'.repeat(40)}`;
    expect(await me(planted)).toBe(401);
    const json = { email: team.designer.email, password };
    const response = await callApi(house, 'POST', '/api/v1/session', { cookie: planted, json });
    expect(response.headers.get('set-cookie')).not.toContain('a'.repeat(40));
  });

  it('is not found in broken cookies, and none of them is a fault of ours', async () => {
    const broken = [
      'dipwright=',
      'dipwright=%E0%A4%A',
      '%E0%A4%A=1; dipwright=x',
      'dipwright',
      ';;;=',
      'dipwright="><script>',
    ];
    for (const cookie of broken) expect(await me(cookie)).toBe(401);
    const cookie = await signInAs(house, team.designer.email, password);
    expect(await me(`%E0%A4%A=1; ${cookie}; other=2`)).toBe(200);
  });

  it('is gone with the hourly tidying once it is over', async () => {
    const cookie = await signInAs(house, team.designer.email, password);
    await move(cookie, 'expires_at', new Date(Date.now() - 1000));
    await tidy(house.context);
    expect(await rowOf(cookie)).toBeUndefined();
  });
});

describe('its cookie', () => {
  it('is HttpOnly, SameSite=Lax, for the whole host, and without TLS has a plain name', async () => {
    const json = { email: team.designer.email, password };
    const response = await callApi(house, 'POST', '/api/v1/session', { json });
    const cookie = response.headers.get('set-cookie')!;
    expect(cookie).toMatch(/^dipwright=[a-z2-7]+; /);
    expect(cookie.split('; ').slice(1).sort()).toEqual([
      'HttpOnly',
      `Max-Age=${longestDays * 24 * 3600}`,
      'Path=/',
      'SameSite=Lax',
    ]);
  });

  it('is __Host- and Secure where TLS is on', async () => {
    const sessions = createSessions(house.database, { tls: true });
    const cookie = await sessions.begin(team.designer);
    expect(cookie).toMatch(/^__Host-dipwright=/);
    expect(cookie).toContain('; Secure');
    expect(cookie).toContain('; Path=/');
    expect(cookie).not.toContain('Domain');
    expect(await sessions.readActor(cookie.split(';')[0]!)).toEqual(team.designer);
    // a cookie without the prefix could have been set by a sibling host
    expect(await sessions.readActor(cookie.split(';')[0]!.replace('__Host-', ''))).toBeNull();
  });
});
