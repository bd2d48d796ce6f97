import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { csv } from '~/server/http/csv';
import type { Team } from '../../../db/seeds/add-workshop';
import { addIssuedTank } from '../support/add-tank';
import { callApi, cookieOf } from '../support/call-api';
import { addTestWorkshop, openHouse, type House } from '../support/house';

describe('csv', () => {
  it('leaves numbers alone and quotes what must be quoted', () => {
    expect(
      csv([
        ['a', 'b'],
        [1.5, -2],
        ['x,y', 'say "hi"'],
        ['two\nlines', ''],
      ]),
    ).toBe('a,b\r\n1.5,-2\r\n"x,y","say ""hi"""\r\n"two\nlines",\r\n');
  });

  it.each(['=1+1', '+1', '-1', '@SUM(A1)', ' =1', '\t=1', '\rx', '\n=1'])(
    'guards %j as text',
    (text) => {
      const cell = csv([[text]])
        .replace(/\r\n$/, '')
        .replace(/^"|"$/g, '');
      expect(cell.startsWith("'")).toBe(true);
    },
  );
});

describe('table.csv', () => {
  let house: House;
  let team: Team;
  let cookie: string;
  beforeAll(async () => {
    house = await openHouse();
    team = await addTestWorkshop(house);
    cookie = await cookieOf(house, team.fitter);
  });
  afterAll(() => house.drop());

  it('has the rows as issued, and a name that a spreadsheet does not run', async () => {
    const { revision } = await addIssuedTank(house, team, {
      name: '=HYPERLINK("http://evil.example")',
    });
    const response = await callApi(house, 'GET', `/api/v1/revisions/${revision.id}/table.csv`, {
      cookie,
    });
    expect(response.status).toBe(200);
    expect(response.headers.get('content-type')).toContain('text/csv');
    expect(response.headers.get('content-disposition')).toMatch(
      /^attachment; filename="[A-Za-z0-9._-]+"; filename\*=UTF-8''/,
    );
    const lines = (await response.text()).trimEnd().split('\r\n');
    expect(lines[0]).toBe('depthMm,volumeL,surfaceCm2,plusMinusL,tank,revision');
    expect(lines).toHaveLength(1 + 31);
    // half a litre a millimetre, 5000 cm² all the way
    expect(lines[13]).toMatch(/^120,60,5000,1,"'=HYPERLINK/);
  });
});
