import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect } from '~/server/database/connect';
import { operations } from '~/server/openapi/operations';
import { problemSchema } from '~/server/openapi/problem-schema';
import type { Team } from '../../../db/seeds/add-workshop';
import { addIssuedTank, type Made } from '../support/add-tank';
import { boxDesign } from '../support/box-design';
import { callApi, routes, cookieOf } from '../support/call-api';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let house: House;
let team: Team;
let made: Made;
let cookie: string;
beforeAll(async () => {
  house = await openHouse();
  team = await addTestWorkshop(house);
  made = await addIssuedTank(house, team);
  cookie = await cookieOf(house, team.manager);
});
afterAll(() => house.drop());

/** Every refusal is told in the same form. */
async function expectProblem(response: Response, status: number): Promise<Record<string, unknown>> {
  expect(response.status).toBe(status);
  expect(response.headers.get('content-type')).toBe('application/problem+json; charset=utf-8');
  expect(response.headers.get('cache-control')).toBe('no-store');
  const problem = problemSchema.parse(await response.json());
  expect(problem.status).toBe(status);
  expect(problem.detail).toMatch(/^\S.*[.!?]$/s);
  return problem;
}

let callers = 0;
/** So that no test uses up what another may call. */
const anotherAddress = (): string => `10.1.${(callers += 1) >> 8}.${callers & 255}`;

const pathOf = ({ path }: { path: string }): string =>
  path.replace('{id}', path.includes('/revisions/{id}') ? made.revision.id : made.tank.id);
const withBody = operations.filter(({ body }) => body !== undefined);
const members = operations.filter(({ access }) => access === 'member');

describe('every call with a body', () => {
  it('is known', () => expect(withBody.length).toBeGreaterThanOrEqual(10));

  describe.each(
    withBody.map((operation) => [`${operation.method} ${operation.path}`, operation] as const),
  )('%s', (_name, operation) => {
    const send = (raw: BodyInit, type = 'application/json') =>
      callApi(house, operation.method, pathOf(operation), {
        cookie,
        raw,
        headers: { 'content-type': type },
        clientAddress: anotherAddress(),
      });

    it('takes JSON only', async () => {
      for (const type of ['text/plain', 'application/xml', 'application/jsonx', 'json', '']) {
        await expectProblem(await send('{}', type), 415);
      }
    });

    it('cannot read what is not JSON', async () => {
      for (const raw of ['', ' ', '{', '{"a":}', "{'a':1}", 'undefined', '\u0000', '[1,]']) {
        await expectProblem(await send(raw), 400);
      }
      await expectProblem(await send(new Uint8Array([0x22, 0xff, 0xfe, 0x22])), 400);
    });

    it('says of JSON of another shape which field is wrong', async () => {
      for (const raw of [
        'null',
        'true',
        '5',
        '"x"',
        '[]',
        '[[[]]]',
        '{"__proto__":{"a":1}}',
        '{"constructor":1}',
      ]) {
        const problem = await expectProblem(await send(raw), 422);
        expect((problem['errors'] as unknown[]).length).toBeGreaterThan(0);
      }
    });

    it('refuses a body over 1 MB', async () => {
      await expectProblem(await send(`{"name":"${'x'.repeat(1024 * 1024)}"}`), 413);
    });
  });
});

describe('bodies nobody foresaw', () => {
  const leaf = fc.oneof(
    fc.constantFrom(
      null,
      true,
      '',
      '=1+1',
      '\u0000',
      '\ud800',
      '🛢',
      'x'.repeat(5000),
      1e308,
      -1e308,
      5e-324,
      -0,
      1e21,
    ),
    fc.double({ noNaN: true, noDefaultInfinity: true }),
    fc.string({ unit: 'binary' }),
  );
  const names = [
    'name',
    'kind',
    'liquid',
    'installationId',
    'settings',
    'stepMm',
    'atMm',
    'at',
    'depthMm',
    'note',
    'userId',
    'solids',
    'id',
    'role',
    'length',
    'width',
    'height',
    'turn',
    'format',
    'version',
    'wall',
    'stick',
    'email',
    'password',
    'outletMm',
    'safeFillPercent',
    'densityKgPerM3',
    'measuredBy',
  ];
  const json = fc.letrec((tie) => ({
    value: fc.oneof(
      { depthSize: 'small', withCrossShrink: true },
      leaf,
      fc.array(tie('value'), { maxLength: 4 }),
      fc.dictionary(fc.constantFrom(...names), tie('value'), { maxKeys: 5 }),
    ),
  })).value;
  /** A right body with some of its places overwritten: gets further in than noise. */
  const right: Record<string, unknown> = {
    signIn: { email: 'a@b.example', password: 'x' },
    signUp: { workshopName: 'W', name: 'N', email: 'n@w.example', password: 'long-enough-one' },
    createInstallation: { name: 'Van', kind: 'vehicle' },
    createTank: {
      installationId: 'i',
      name: 'T',
      liquid: 'diesel',
      design: boxDesign(),
      settings: { outletMm: 1 },
    },
    changeTank: {
      name: 'T',
      liquid: 'other',
      densityKgPerM3: 900,
      safeFillPercent: 90,
      measuredBy: 'stated',
    },
    saveDesign: boxDesign(),
    handOverTank: { userId: 'u' },
    recordReading: { at: '2026-11-30T08:15:00Z', depthMm: 10, note: 'n' },
    issueRevision: { stepMm: 10, note: 'n' },
    computeTable: { design: boxDesign(), stepMm: 10 },
  };
  const damaged = (body: unknown) =>
    fc.array(fc.tuple(fc.nat(40), leaf), { minLength: 1, maxLength: 3 }).map((hits) => {
      let place = 0;
      const walk = (value: unknown): unknown => {
        const hit = hits.find(([at]) => at === place);
        place += 1;
        if (hit !== undefined) return hit[1];
        if (Array.isArray(value)) return value.map(walk);
        if (typeof value === 'object' && value !== null) {
          return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, walk(item)]));
        }
        return value;
      };
      return walk(body);
    });

  it('has a right body for each call', () => {
    expect(Object.keys(right).sort()).toEqual(withBody.map(({ id }) => id).sort());
  });

  it.each(withBody.map(({ id }) => id))('never make %s fail', async (id) => {
    const operation = operations.find((one) => one.id === id)!;
    let caller = 0;
    let asked = 0;
    const bodies = fc.oneof(
      { arbitrary: json, weight: 1 },
      { arbitrary: damaged(right[id]), weight: 3 },
    );
    await fc.assert(
      fc.asyncProperty(bodies, async (body) => {
        caller += 1;
        asked += 1;
        const response = await callApi(house, operation.method, pathOf(operation), {
          cookie,
          json: body,
          headers: { 'idempotency-key': `fuzz-${caller}`, 'if-match': '"1"' },
          clientAddress: anotherAddress(),
        });
        expect(response.status).toBeLessThan(500);
        if (response.status >= 400) await expectProblem(response, response.status);
      }),
      { numRuns: 150, seed: 20_261_130 },
    );
    expect(asked).toBeGreaterThanOrEqual(150);
  });
});

describe('the same for every call', () => {
  it.each(members.map(({ method, path }) => [method, path]))(
    '%s %s asks for a session',
    async (method, path) => {
      const response = await callApi(house, method, pathOf({ path }), {
        json: method === 'GET' ? undefined : {},
      });
      const problem = await expectProblem(response, 401);
      expect(problem['code']).toBe('unauthenticated');
    },
  );

  it.each(
    operations
      .filter(({ path }) => path.includes('{id}'))
      .map(({ method, path }) => [method, path]),
  )('%s %s finds nothing by an id of another form', async (method, path) => {
    for (const id of [
      '1',
      'null',
      "'%20OR%201=1",
      '..%2f..',
      made.tank.id.toUpperCase(),
      '%00',
      '٣'.repeat(36),
    ]) {
      const response = await callApi(house, method, path.replace('{id}', id), {
        cookie,
        json: method === 'GET' ? undefined : {},
        headers: { 'idempotency-key': 'k', 'if-match': '"1"' },
      });
      await expectProblem(response, 404);
    }
  });

  it('another method is 405 with those that there are', async () => {
    const addresses = Object.keys(routes).filter((address) => address !== '/api/{path}');
    expect(addresses.length).toBeGreaterThanOrEqual(20);
    for (const address of addresses) {
      const own = operations
        .filter(({ path }) => path === address)
        .map(({ method }) => method as string);
      const path = pathOf({ path: address });
      for (const method of ['PUT', 'PATCH', 'DELETE', 'POST', 'OPTIONS'].filter(
        (name) => !own.includes(name),
      )) {
        const response = await callApi(house, method, path, { cookie });
        await expectProblem(response, 405);
        const allow = response.headers.get('allow')!.split(', ');
        expect(allow.filter((name) => name !== 'HEAD').sort()).toEqual([...own].sort());
      }
    }
  });

  it('HEAD is GET without its body', async () => {
    const response = await callApi(house, 'HEAD', `/api/v1/tanks/${made.tank.id}`, { cookie });
    expect(response.status).toBe(200);
    expect(await response.text()).toBe('');
    expect(response.headers.get('content-type')).toContain('application/json');
  });

  it('an address that is not there is 404', async () => {
    for (const path of [
      '/api/v1/nothing',
      '/api/v2/tanks',
      '/api/v1',
      `/api/v1/tanks/${made.tank.id}/x`,
    ]) {
      await expectProblem(await callApi(house, 'GET', path, { cookie }), 404);
    }
  });

  it('a query that does not fit is 422 with its name', async () => {
    const asks = [
      ['volume', ''],
      ['volume', '?depthMm=1&ullageMm=1'],
      ['volume', '?depthMm=1&depthMm=2'],
      ['volume', '?depthMm='],
      ['volume', '?depthMm=1e2'],
      ['volume', '?depthMm=NaN'],
      ['volume', '?depthMm=150&unit=cm'],
      ['volume', '?depthMm=300.1'],
      ['volume', '?depthMm=-1'],
      ['volume', '?ullageMm=300.1'],
      ['volume', '?__proto__=1'],
      ['depth', ''],
      ['depth', '?volumeL=1e999'],
      ['depth', '?volumeL=150.1'],
      ['depth', '?volumeL=-0.1'],
      ['chart.pdf', '?paper=a5'],
      ['chart.pdf', '?volume=gal'],
    ];
    for (const [call, query] of asks) {
      const response = await callApi(
        house,
        'GET',
        `/api/v1/revisions/${made.revision.id}/${call}${query}`,
        { cookie },
      );
      const problem = await expectProblem(response, 422);
      expect((problem['errors'] as unknown[]).length).toBeGreaterThan(0);
    }
  });
});

describe('a fault of ours', () => {
  it('is told without its cause, which stands in the log under the request’s id', async () => {
    await house.database.sequelize.query('DROP TRIGGER strapping_rows_refuse_update');
    const ids = { replacements: [made.revision.id] };
    await house.database.sequelize.query(
      'UPDATE strapping_rows SET volume_l = 1 WHERE revision_id = ? AND row_no = 1',
      ids,
    );
    const response = await callApi(house, 'GET', `/api/v1/revisions/${made.revision.id}/table`, {
      cookie,
    });
    const problem = await expectProblem(response, 500);
    expect(JSON.stringify(problem)).not.toContain('hash');
    expect(
      house.logged.some(
        (line) => line.includes(String(problem['requestId'])) && line.includes('hash'),
      ),
    ).toBe(true);
  });

  it('is 503 when the database does not answer', async () => {
    const nobodyListens = connect({ ...house.address, port: 1 });
    const sessions = { ...house.context.sessions, readActor: async () => team.manager };
    const context = { ...house.context, database: nobodyListens, sessions };
    const response = await callApi({ ...house, context }, 'GET', '/api/v1/tanks');
    await nobodyListens.close();
    const problem = await expectProblem(response, 503);
    expect(problem['code']).toBe('unavailable');
    expect(Number(response.headers.get('retry-after'))).toBeGreaterThan(0);
  });
});

describe('calls per client address', () => {
  it('are limited where they cost us, each address for itself', async () => {
    const ask = (clientAddress: string) =>
      callApi(house, 'POST', '/api/v1/workshops', { json: {}, clientAddress });
    const statuses = [];
    for (let call = 0; call < 22; call += 1) statuses.push((await ask('192.0.2.7')).status);
    expect(statuses.slice(0, 20)).toEqual(Array.from({ length: 20 }, () => 422));
    const refused = await ask('192.0.2.7');
    const problem = await expectProblem(refused, 429);
    expect(refused.headers.get('retry-after')).toBe(String(problem['retryAfterS']));
    expect((await ask('192.0.2.8')).status).toBe(422);
    // one host of IPv6 has a whole /64 to call from
    for (let call = 0; call < 20; call += 1) await ask(`2001:db8:1:2::${call.toString(16)}`);
    expect((await ask('2001:db8:1:2:ffff::1')).status).toBe(429);
    expect((await ask('2001:db8:1:3::1')).status).toBe(422);
    house.later(61);
    expect((await ask('192.0.2.7')).status).toBe(422);
  });
});
