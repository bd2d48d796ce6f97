import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { TankSettings } from '~/domain/tank/settings';
import { canonicalJson } from '~/server/services/canonical-json';
import { levelPerReading } from '~/server/services/level-per-reading';
import { contentHash, designHash, revisionHash } from '~/server/services/revision-hash';
import { boxDesign } from '../support/box-design';

const settings: TankSettings = {
  liquid: 'diesel',
  densityKgPerM3: null,
  safeFillPercent: 95,
  outletMm: 40,
  referenceHeightMm: null,
  measuredBy: 'tape',
  sizePlusMinusMm: 2,
  dipPlusMinusMm: 2,
};

describe('canonicalJson', () => {
  it('has one spelling, whatever the order of keys', () => {
    expect(canonicalJson({ b: [1, { d: null, c: 'é"\n' }], a: true, z: undefined })).toBe(
      '{"a":true,"b":[1,{"c":"é\\"\\n","d":null}]}',
    );
    // numbers as ECMAScript prints them, which RFC 8785 takes over (examples of its appendix B)
    expect(canonicalJson([333333333.33333329, 1e30, 4.5, 2e-3, 1e-27, -0])).toBe(
      '[333333333.3333333,1e+30,4.5,0.002,1e-27,0]',
    );
  });
});

describe('revisionHash', () => {
  const design =
    '{"format":"dipwright-tank","name":"Box","solids":[{"height":300,"id":"body","kind":"box","length":1000,"role":"holds","width":500}],"version":1}';
  const frozen =
    '{"densityKgPerM3":null,"dipPlusMinusMm":2,"liquid":"diesel","measuredBy":"tape","outletMm":40,"referenceHeightMm":null,"safeFillPercent":95,"sizePlusMinusMm":2}';
  const sha256 = (lines: readonly string[]) =>
    createHash('sha256').update(lines.join('\n')).digest('hex');
  const printed = { betweenRows: false };

  it('is SHA-256 over the lines that docs/api.md describes', () => {
    const rows = [
      { depthMm: 0, volumeL: 0, surfaceCm2: 5000, plusMinusL: 1, ...printed },
      { depthMm: 0.125, volumeL: 0.0625, surfaceCm2: 5000, plusMinusL: 1, betweenRows: true },
      {
        depthMm: 0.1 + 0.2,
        volumeL: 0.15000000000000002,
        surfaceCm2: 5000,
        plusMinusL: 1e-7,
        ...printed,
      },
    ];
    const expected = sha256([
      'dipwright-revision 2',
      design,
      frozen,
      '0.75',
      '0,0,5000,1',
      '0.125,0.0625,5000,1,between',
      '0.30000000000000004,0.15000000000000002,5000,1e-7',
      '',
    ]);
    expect(revisionHash(boxDesign(), settings, rows, 0.75)).toBe(expected);
  });

  it('of a revision from before the ± of its brim was frozen is as it was', () => {
    const rows = [
      { depthMm: 0, volumeL: 0, surfaceCm2: 5000, plusMinusL: 1, ...printed },
      {
        depthMm: 0.1 + 0.2,
        volumeL: 0.15000000000000002,
        surfaceCm2: 5000,
        plusMinusL: 1e-7,
        ...printed,
      },
    ];
    const lines = [
      'dipwright-revision 1',
      design,
      frozen,
      '0,0,5000,1',
      '0.30000000000000004,0.15000000000000002,5000,1e-7',
      '',
    ];
    expect(revisionHash(boxDesign(), settings, rows, null)).toBe(sha256(lines));
  });

  it('changes with every part', () => {
    const row = { depthMm: 1, volumeL: 2, surfaceCm2: 3, plusMinusL: 4, ...printed };
    const ofRows = (...rows: (typeof row)[]) => revisionHash(boxDesign(), settings, rows, 1);
    const hashes = [
      ofRows(row),
      revisionHash(boxDesign(1001), settings, [row], 1),
      revisionHash(boxDesign(), { ...settings, outletMm: 41 }, [row], 1),
      revisionHash(
        boxDesign(),
        { ...settings, ownSizePlusMinusMm: { 'body/length': 1 } },
        [row],
        1,
      ),
      revisionHash(boxDesign(), settings, [row], 1.0000000000000002),
      revisionHash(boxDesign(), settings, [row], null),
      ofRows(row, row),
      ofRows({ ...row, depthMm: 1.0000000000000002 }),
      ofRows({ ...row, volumeL: 2.0000000000000004 }),
      ofRows({ ...row, surfaceCm2: 5 }),
      ofRows({ ...row, plusMinusL: 5 }),
      ofRows({ ...row, betweenRows: true }),
    ];
    expect(new Set(hashes).size).toBe(hashes.length);
  });
});

it('contentHash tells designs and settings apart', () => {
  const one = contentHash(designHash(boxDesign()), settings);
  expect(contentHash(designHash(boxDesign()), { ...settings })).toBe(one);
  expect(contentHash(designHash(boxDesign(1001)), settings)).not.toBe(one);
  expect(contentHash(designHash(boxDesign()), { ...settings, safeFillPercent: 94 })).not.toBe(one);
});

describe('levelPerReading', () => {
  const tilted = { ...boxDesign(), attitude: { pitch: 3, roll: -4 } };

  it('is 1 on the level, and without a stick', () => {
    expect(levelPerReading(boxDesign())).toBe(1);
    expect(levelPerReading(tilted)).toBe(1);
    expect(levelPerReading({ ...boxDesign(), stick: { at: [1, 1] } })).toBe(1);
  });

  it('is the cosine of the tilt along a stick', () => {
    const stick = { at: [1, 1] as [number, number] };
    expect(
      levelPerReading({ ...boxDesign(), stick, attitude: { pitch: 10, roll: 0 } }),
    ).toBeCloseTo(Math.cos((10 * Math.PI) / 180), 14);
    // 1/√(1 + tan² 3° + tan² 4°)
    expect(levelPerReading({ ...tilted, stick })).toBeCloseTo(0.9962036, 6);
  });
});
