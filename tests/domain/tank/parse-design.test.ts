import { describe, expect, it } from 'vitest';
import type { DipwrightError } from '~/domain/errors';
import { kinds } from '~/domain/tank/kinds/registry';
import { parseDesign } from '~/domain/tank/parse-design';
import { slopedCistern } from '../table/designs';

const [body] = slopedCistern.solids;

function faultsOf(value: unknown) {
  try {
    parseDesign(value);
  } catch (error) {
    expect((error as DipwrightError).code).toBe('invalid');
    return (error as DipwrightError).faults.map(({ pointer, detail }) => [pointer, detail]);
  }
  throw new Error('was not refused');
}

const withBody = (change: object) => ({ ...slopedCistern, solids: [{ ...body, ...change }] });

describe('parseDesign', () => {
  it('takes a good design as it is', () => {
    expect(parseDesign(JSON.parse(JSON.stringify(slopedCistern)))).toEqual(slopedCistern);
  });

  it.each([
    [
      withBody({ height: -1 }),
      '/solids/0/height',
      'Solid "body", height: a length is more than 0 mm.',
    ],
    [
      withBody({ height: 100_001 }),
      '/solids/0/height',
      'Solid "body", height: a length is at most 100 000 mm.',
    ],
    [
      withBody({ height: '300' }),
      '/solids/0/height',
      'Solid "body", height: give a length in millimetres.',
    ],
    [
      withBody({ height: Infinity }),
      '/solids/0/height',
      'Solid "body", height: give a length in millimetres.',
    ],
    [
      withBody({ height: undefined }),
      '/solids/0/height',
      'Solid "body", height: this field is missing.',
    ],
    [
      withBody({ hight: 1 }),
      '/solids/0/hight',
      'Solid "body", hight: there is no such field here.',
    ],
    [
      withBody({ 'a/b~c': 1 }),
      '/solids/0/a~1b~0c',
      'Solid "body", a/b~c: there is no such field here.',
    ],
    [
      withBody({ at: [0, 0, 1e6] }),
      '/solids/0/at/2',
      'Solid "body", at, number 3: a place lies within ± 100 000 mm.',
    ],
    [
      withBody({ role: 'contains' }),
      '/solids/0/role',
      'Solid "body", role: the role is "holds" or "displaces".',
    ],
    [withBody({ id: '' }), '/solids/0/id', 'Solid 1, id: an id has at least one character.'],
    [
      withBody({ edges: { z: '20' } }),
      '/solids/0/edges/z',
      'Solid "body", edges, z: give the radius of an edge in millimetres.',
    ],
    [
      { ...slopedCistern, solids: [body, body] },
      '/solids/1/id',
      /^Solid "body", id: two solids have the id "body"/,
    ],
    [{ ...slopedCistern, solids: [] }, '/solids', 'Solids: a tank needs at least one solid.'],
    [
      { ...slopedCistern, attitude: { pitch: 61, roll: 0 } },
      '/attitude/pitch',
      'Attitude, pitch: a slope lies within ± 60°.',
    ],
    [{ ...slopedCistern, version: 2 }, '/version', 'Version: the version is 1.'],
    [
      { ...slopedCistern, stick: { at: [1, 2], zero: 'low' } },
      '/stick/zero',
      'Stick, zero: give a number.',
    ],
    [null, '', /^A design is a JSON object/],
    [[], '', /^A design is a JSON object/],
  ])('refuses, naming solid and field: case %#', (value, pointer, sentence) => {
    const [[atPointer, detail]] = faultsOf(value) as [[string, string]];
    expect(atPointer).toBe(pointer);
    if (sentence instanceof RegExp) expect(detail).toMatch(sentence);
    else expect(detail).toBe(sentence);
  });

  it('refuses a kind that there is none of, and names those there are', () => {
    const [[pointer, detail]] = faultsOf(withBody({ kind: 'blob' })) as [[string, string]];
    expect(pointer).toBe('/solids/0/kind');
    for (const { kind } of kinds) expect(detail).toContain(kind);
  });

  it('refuses more than 200 solids and lists every fault at once', () => {
    const many = Array.from({ length: 201 }, (_, i) => ({ ...body, id: `s${i}` }));
    expect(faultsOf({ ...slopedCistern, solids: many })[0]![0]).toBe('/solids');
    expect(faultsOf(withBody({ height: 0, width: 0 }))).toHaveLength(2);
  });
});
