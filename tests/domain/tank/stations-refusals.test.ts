import { describe, expect, it } from 'vitest';
import type { DipwrightError } from '~/domain/errors';
import { computeTable } from '~/domain/table/compute-table';
import type { Solid } from '~/domain/tank/kinds/registry';
import type { Stations } from '~/domain/tank/kinds/stations/schema';
import { parseDesign } from '~/domain/tank/parse-design';
import { design } from '../table/designs';

type Profile = [number, number][];

function stationsOf(
  sections: readonly (readonly [number, Profile])[],
  rest: Partial<Stations> = {},
): Stations {
  const list = sections.map(([x, profile]) => ({ x, profile }));
  return { id: 'h', role: 'holds', kind: 'stations', stations: list, ...rest };
}

describe('stations that cannot be are refused by name', () => {
  const other: Profile = [
    [-1, -1],
    [1, -1],
    [1, 1],
    [-1, 1],
  ];
  it.each<[string, unknown, string, RegExp]>([
    [
      'one station',
      stationsOf([[0, other]]),
      '/solids/0/stations',
      /a hull has at least two stations/,
    ],
    [
      'two points',
      stationsOf([
        [0, other.slice(2)],
        [9, other],
      ]),
      '/solids/0/stations/0/profile',
      /^Solid "h", stations, number 1, profile: a profile has at least three points/,
    ],
    [
      'uneven counts',
      stationsOf([
        [0, other],
        [9, other.slice(1)],
      ]),
      '/solids/0/stations/1/profile',
      /station 2 has 3 points and station 1 has 4: all have as many/,
    ],
    [
      'x that falls',
      stationsOf([
        [0, other],
        [9, other],
        [8, other],
      ]),
      '/solids/0/stations/2/x',
      /x rises from station to station by at least 0.01 mm: station 3 stands at 8, the one before it at 9/,
    ],
    [
      'x that stands',
      stationsOf([
        [0, other],
        [0, other],
      ]),
      '/solids/0/stations/1/x',
      /x rises from station to station/,
    ],
    [
      'a station that crosses itself',
      stationsOf([
        [0, other],
        [9, [other[0]!, other[2]!, other[1]!, other[3]!]],
      ]),
      '/solids/0/stations/1/profile',
      /the side from point 1 to point 2 and the side from point 3 to point 4 cross or touch/,
    ],
    [
      'a station with no area, as at a sharp stem',
      stationsOf([
        [0, other],
        [
          9,
          [
            [0, 0],
            [0, 1],
            [0, 2],
            [0, 3],
          ],
        ],
      ]),
      '/solids/0/stations/1/profile',
      /lie on one line: it encloses no area/,
    ],
    [
      'a point twice',
      stationsOf([
        [0, [other[0]!, other[1]!, other[1]!, other[3]!]],
        [9, other],
      ]),
      '/solids/0/stations/0/profile/2',
      /less than 0.01 mm from the one before it/,
    ],
    [
      'stations that run both ways',
      stationsOf([
        [0, other],
        [5, other],
        [9, [...other].reverse()],
      ]),
      '/solids/0/stations/2/profile',
      /the points of station 3 run the other way round than those of station 1/,
    ],
    [
      'stations whose points do not answer each other',
      stationsOf([
        [0, other],
        [5, other],
        [9, [...other.slice(2), ...other.slice(0, 2)]],
      ]),
      '/solids/0/stations/2/profile',
      /between stations 2 and 3, at x 7, point 2 meets the side from point 1 to point 2/,
    ],
    [
      'too many points in all',
      stationsOf(
        Array.from({ length: 40 }, (_, i): [number, Profile] => [
          i,
          Array.from({ length: 30 }, (__, j): [number, number] => [
            Math.cos((j * Math.PI) / 15),
            Math.sin((j * Math.PI) / 15),
          ]),
        ]),
      ),
      '/solids/0/stations',
      /all profiles together have at most 1000 points/,
    ],
    [
      'a third number',
      stationsOf([
        [0, other],
        [9, [[0, 0, 5] as unknown as [number, number], ...other.slice(1)]],
      ]),
      '/solids/0/stations/1/profile/0',
      /^Solid "h", stations, number 2, profile, number 1: /,
    ],
  ])('%s', async (_, solid, pointer, detail) => {
    let fault: unknown = null;
    try {
      await computeTable(parseDesign(design([solid as Solid])), { stepMm: 50 });
    } catch (error) {
      fault = (error as DipwrightError).faults[0];
    }
    expect(fault).toEqual({ pointer, detail: expect.stringMatching(detail) as string });
  });
});
