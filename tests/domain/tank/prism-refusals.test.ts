import { describe, expect, it } from 'vitest';
import type { DipwrightError } from '~/domain/errors';
import { computeTable } from '~/domain/table/compute-table';
import { prism } from '~/domain/tank/kinds/prism/prism';
import type { Prism } from '~/domain/tank/kinds/prism/schema';
import type { Solid } from '~/domain/tank/kinds/registry';
import { parseDesign } from '~/domain/tank/parse-design';
import { design } from '../table/designs';

type Profile = Prism['profile'];

function prismOf(profile: Profile, width = 100, rest: Partial<Prism> = {}): Prism {
  return { id: 'p', role: 'holds', kind: 'prism', profile, width, ...rest };
}

const steps = { stepMm: 20 };

const square: Profile = [
  [0, 0],
  [400, 0],
  [400, 400],
  [0, 400],
];
const rounded = (...radii: readonly number[]): Profile =>
  square.map(([x, z], i) => [x, z, radii[i]!]);

describe('a profile that cannot be is refused by name', () => {
  it.each<[string, Profile, string, RegExp]>([
    [
      'two points',
      square.slice(0, 2),
      '/solids/0/profile',
      /profile: a profile has at least three points/,
    ],
    [
      'two different points',
      [square[0]!, square[1]!, square[0]!],
      '/solids/0/profile',
      /at least three different points/,
    ],
    [
      'a point twice',
      [...square.slice(0, 2), square[1]!, ...square.slice(2)],
      '/solids/0/profile/2',
      /less than 0.01 mm from the one before it/,
    ],
    [
      'the first point again at the end',
      [...square, [0, 0.001]],
      '/solids/0/profile/0',
      /less than 0.01 mm from the one before it/,
    ],
    [
      'one line',
      [
        [0, 0],
        [100, 100],
        [300, 300],
        [200, 200],
      ],
      '/solids/0/profile',
      /lie on one line: it encloses no area/,
    ],
    [
      'a bow tie',
      [square[0]!, square[1]!, square[3]!, square[2]!],
      '/solids/0/profile',
      /the side from point 2 to point 3 and the side from point 4 to point 1 cross or touch/,
    ],
    [
      'a corner that touches a side',
      [...square.slice(0, 3), [200, 0], [0, 400]],
      '/solids/0/profile',
      /the side from point 1 to point 2 and the side from point 3 to point 4 cross or touch/,
    ],
    [
      'a spike of no width',
      [...square.slice(0, 2), [600, 0], [400, 0.0000001], ...square.slice(2)].filter(
        (_, i) => i !== 1,
      ) as Profile,
      '/solids/0/profile',
      /cross or touch/,
    ],
    [
      'a radius wider than its side',
      rounded(401, 0, 0, 0),
      '/solids/0/profile/0/2',
      /profile, number 1, number 3: a radius of 401 mm does not fit on the two sides of this corner: at most 400 mm does/,
    ],
    [
      'two radii that share a side',
      rounded(150, 260, 0, 0),
      '/solids/0/profile/1/2',
      /a radius of 260 mm does not fit .* at most 250 mm does/,
    ],
    [
      'a radius on a straight corner',
      [[0, 0], [200, 0, 10], ...square.slice(1)],
      '/solids/0/profile/1/2',
      /goes straight on here, so there is nothing to round/,
    ],
    [
      'a rounding that another part reaches into',
      [
        [0, 0, 350],
        [400, 0],
        [400, 400],
        [50, 50],
        [0, 400],
      ],
      '/solids/0/profile/0/2',
      /another part of the profile reaches into the rounding/,
    ],
    ['a radius below 0', rounded(-1, 0, 0, 0), '/solids/0/profile/0/2', /a radius is 0 mm or more/],
    [
      'a radius that is nothing',
      rounded(0.001, 0, 0, 0),
      '/solids/0/profile/0/2',
      /a size is at least 0.01 mm/,
    ],
    [
      'a fourth number',
      [[0, 0, 1, 2], ...square.slice(1)] as unknown as Profile,
      '/solids/0/profile/0',
      /^Solid "p", profile, number 1: /,
    ],
    [
      '201 points',
      Array.from({ length: 201 }, (_, i) => [i, i * i]),
      '/solids/0/profile',
      /at most 200 points/,
    ],
  ])('%s', async (_, profile, pointer, detail) => {
    expect(await faultOf(prismOf(profile))).toEqual({
      pointer,
      detail: expect.stringMatching(detail) as string,
    });
  });

  it('what it says of a radius is true: the one it names fits', () => {
    for (const profile of [
      rounded(150, 260, 0, 0),
      rounded(300, 300, 300, 300),
      [
        [0, 0, 900],
        [600, 10],
        [250, 500, 80],
      ] as Profile,
    ]) {
      const said = (faulty: Profile) =>
        prism.faults(prismOf(faulty)).map(({ path, detail }) => ({
          i: Number(path[1]),
          most: Number(/at most ([\d.]+) mm/.exec(detail)![1]),
        }));
      const mended = structuredClone(profile);
      for (const { i, most } of said(profile)) mended[i]![2] = most;
      expect(said(profile).length).toBeGreaterThan(0);
      expect(prism.faults(prismOf(mended))).toEqual([]);
    }
  });
});

async function faultOf(solid: Solid) {
  try {
    await computeTable(parseDesign(design([solid])), steps);
  } catch (error) {
    return (error as DipwrightError).faults[0];
  }
  return null;
}
