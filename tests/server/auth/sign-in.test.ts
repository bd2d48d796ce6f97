import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { delaySeconds, freeFailures } from '~/server/auth/sign-in-delay';
import type { Team } from '../../../db/seeds/add-workshop';
import { callApi } from '../support/call-api';
import { addTestWorkshop, openHouse, password, type House } from '../support/house';

let house: House;
let team: Team;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
});
beforeEach(() => house.database.sequelize.query('DELETE FROM sign_in_attempts'));
afterAll(() => house.drop());

let caller = 0;
/** Each from another address, so that only the account counts. */
const signIn = (email: string, given: string) =>
  callApi(house, 'POST', '/api/v1/session', {
    json: { email, password: given },
    clientAddress: `10.0.${(caller += 1) >> 8}.${caller & 255}`,
  });
const told = async (response: Response) => {
  const { requestId: _one, ...problem } = await response.json();
  return problem;
};

it('does not tell a known address from an unknown one, in words or in time', async () => {
  const known = await signIn(team.fitter.email, 'not the password');
  const unknown = await signIn('nobody@elsewhere.example', 'not the password');
  expect([known.status, unknown.status]).toEqual([401, 401]);
  expect(await told(known)).toEqual(await told(unknown));
  expect([...known.headers.keys()]).toEqual([...unknown.headers.keys()]);

  const median = async (email: (turn: number) => string) => {
    const times: number[] = [];
    for (let turn = 0; turn < 9; turn += 1) {
      const from = performance.now();
      await signIn(email(turn), 'not the password');
      times.push(performance.now() - from);
      await house.database.sequelize.query('DELETE FROM sign_in_attempts');
    }
    return times.sort((a, b) => a - b)[4]!;
  };
  const forKnown = await median(() => team.fitter.email);
  const forUnknown = await median((turn) => `nobody${turn}@elsewhere.example`);
  // without the same hashing the two differ tenfold; the margin is for a busy machine
  expect(forUnknown / forKnown).toBeGreaterThan(0.4);
  expect(forUnknown / forKnown).toBeLessThan(2.5);
});

it('takes the address in any case and with spaces around it', async () => {
  expect((await signIn(` ${team.fitter.email.toUpperCase()} `, password)).status).toBe(204);
});

it('keeps no password, only argon2id with the stated cost', async () => {
  const rows = await house.sql<{ password_hash: string }>('SELECT password_hash FROM users');
  expect(rows.length).toBeGreaterThan(0);
  for (const { password_hash } of rows)
    expect(password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
});

describe('the delay of an account', () => {
  it('grows, and has an end', () => {
    const delays = Array.from({ length: 20 }, (_, failures) => delaySeconds(failures));
    expect(delays.slice(0, freeFailures)).toEqual(Array.from({ length: freeFailures }, () => 0));
    expect(delays.slice(freeFailures, freeFailures + 4)).toEqual([2, 4, 8, 16]);
    expect(Math.max(...delays)).toBe(300);
    expect(delays).toEqual([...delays].sort((a, b) => a - b));
  });

  it.each(['known', 'unknown'])(
    'begins after five wrong passwords for a %s address',
    async (kind) => {
      const email = kind === 'known' ? team.designer.email : 'nobody@elsewhere.example';
      for (let failure = 1; failure <= freeFailures; failure += 1) {
        expect((await signIn(email, 'wrong')).status).toBe(401);
      }
      const waiting = await signIn(email, password);
      expect(waiting.status).toBe(429);
      const problem = await waiting.json();
      expect(problem.code).toBe('rate-limited');
      expect(waiting.headers.get('retry-after')).toBe(String(problem.retryAfterS));
      expect(problem.retryAfterS).toBeGreaterThan(0);
      expect(problem.retryAfterS).toBeLessThanOrEqual(2);
    },
  );

  it('is over after its time: the right password then works, and the count begins anew', async () => {
    const { email } = team.owner;
    for (let failure = 1; failure <= freeFailures + 1; failure += 1) {
      await signIn(email, 'wrong');
      if (failure >= freeFailures) house.later(delaySeconds(failure) + 1);
    }
    expect((await signIn(email, password)).status).toBe(204);
    for (let failure = 1; failure < freeFailures; failure += 1) await signIn(email, 'wrong');
    expect((await signIn(email, password)).status).toBe(204);
  });

  it('is not grown by attempts that come while it lasts', async () => {
    const { email } = team.owner;
    for (let attempt = 0; attempt < freeFailures + 10; attempt += 1) await signIn(email, 'wrong');
    const rows = await house.sql<{ failures: number }>('SELECT failures FROM sign_in_attempts');
    expect(rows).toEqual([{ failures: freeFailures }]);
  });

  it('lets no more through when many come at once', async () => {
    const answers = await Promise.all(
      Array.from({ length: 15 }, () => signIn('crowd@elsewhere.example', 'wrong')),
    );
    const looked = answers.filter(({ status }) => status === 401).length;
    expect(looked).toBe(freeFailures);
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(15 - freeFailures);
  });

  it('keeps no address, only its hash', async () => {
    await signIn('someone@elsewhere.example', 'wrong');
    const rows = await house.sql('SELECT * FROM sign_in_attempts');
    expect(JSON.stringify(rows)).not.toContain('someone');
  });
});

describe('sign-up', () => {
  const form = {
    workshopName: 'Fellfoot Boats',
    name: 'Nan Airey',
    email: 'nan@fellfoot.example',
    password: 'a-long-enough-one',
  };
  const signUp = (json: unknown) => callApi(house, 'POST', '/api/v1/workshops', { json });

  it('opens a workshop whose first member is its manager, signed in', async () => {
    const response = await signUp(form);
    expect(response.status).toBe(201);
    const { workshopId } = await response.json();
    expect(workshopId).toMatch(/^[0-9a-f-]{36}$/);
    const cookie = response.headers.get('set-cookie')!.split(';')[0]!;
    const me = await (await callApi(house, 'GET', '/api/v1/me', { cookie })).json();
    expect(me).toEqual({
      name: 'Nan Airey',
      email: 'nan@fellfoot.example',
      role: 'manager',
      workshopName: 'Fellfoot Boats',
    });
    expect((await signIn(form.email, form.password)).status).toBe(204);
  });

  it('refuses an address that has an account, and leaves no half workshop', async () => {
    const before = (await house.sql('SELECT id FROM workshops')).length;
    const response = await signUp({ ...form, workshopName: 'Another', email: team.fitter.email });
    expect(response.status).toBe(409);
    expect((await response.json()).errors[0].pointer).toBe('/email');
    expect(await house.sql('SELECT id FROM workshops')).toHaveLength(before);
  });

  it('says what each field needs', async () => {
    const response = await signUp({ workshopName: ' ', name: '', email: 'nan', password: 'short' });
    expect(response.status).toBe(422);
    const { errors } = await response.json();
    expect(errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '/email',
      '/name',
      '/password',
      '/workshopName',
    ]);
  });
});
