import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DipwrightError } from '~/domain/errors';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computePreview } from '~/domain/table/compute-preview';
import { computeTable } from '~/domain/table/compute-table';
import { withSizes } from '~/domain/tank/kinds/measured-sizes';
import { kindOf, kinds, type Solid } from '~/domain/tank/kinds/registry';
import { parseDesign } from '~/domain/tank/parse-design';
import { flatSolids } from '../tank/flat-solids';
import { box, design } from './designs';

/** Sizes from nothing to the limit, often equal ones, so that faces meet. */
const size = fc.oneof(
  fc.constantFrom(0.01, 0.02, 1, 99.999999, 100, 100_000),
  fc.double({ min: 0.01, max: 100_000, noNaN: true }),
  fc.double({ min: 10, max: 1000, noNaN: true }),
  fc.double({ min: 10, max: 1000, noNaN: true }),
);
const place = fc.oneof(
  fc.constantFrom(0, 50, 100, -100_000),
  fc.double({ min: -500, max: 500, noNaN: true }),
);
const turn = fc.oneof(
  fc.constantFrom(0, 90, 180, 45, 1e-9),
  fc.double({ min: -360, max: 360, noNaN: true }),
);
const three = <T>(one: fc.Arbitrary<T>) => fc.tuple(one, one, one);

const seldom = <T>(one: fc.Arbitrary<T>) =>
  fc.oneof({ arbitrary: fc.constant(undefined), weight: 3 }, { arbitrary: one, weight: 1 });

const solid = fc
  .record({
    example: fc.constantFrom(...kinds.map((kind) => kind.blank('it')), ...flatSolids),
    sizes: fc.array(size, { minLength: 5, maxLength: 5 }),
    // most of what stands in lists stays as it is, or few outlines would not cross themselves
    places: fc.array(seldom(seldom(place)), { minLength: 7, maxLength: 7 }),
    listed: fc.array(seldom(seldom(size)), { minLength: 7, maxLength: 7 }),
    at: three(place),
    turn: three(turn),
    holds: fc.constantFrom(true, true, false),
  })
  .map(({ example, sizes, places, listed, at, turn: turned, holds }): Solid => {
    const one = kindOf(example)
      .sizes(example)
      .reduce((changed, { path, coordinate }, i) => {
        const value = (coordinate ? places : path.length > 1 ? listed : sizes)[
          i % (path.length > 1 ? 7 : 5)
        ];
        return value === undefined ? changed : withSizes(changed, [path], value);
      }, example);
    return { ...one, at, turn: turned, role: holds ? 'holds' : 'displaces' } as unknown as Solid;
  });

const tank = fc
  .record({
    solids: fc.array(solid, { minLength: 1, maxLength: 4 }),
    pitch: fc.constantFrom(0, 0, 60, -13.7),
    stick: seldom(fc.tuple(place, place)),
    outlet: seldom(three(place)),
  })
  .map(({ solids, pitch, stick, outlet }) =>
    design(
      solids.map((one, i) => ({ ...one, id: `s${i}` })),
      {
        attitude: { pitch, roll: 0 },
        ...(stick ? { stick: { at: stick } } : {}),
        ...(outlet ? { outlet } : {}),
      },
    ),
  );

describe('hostile designs', { timeout: 180_000 }, () => {
  it('are computed, finite and in order, or refused with a sentence', async () => {
    let computed = 0;
    const met = new Set<string>();
    await fc.assert(
      fc.asyncProperty(tank, async (one) => {
        try {
          const table = await computePreview(parseDesign(one));
          computed += 1;
          for (const { kind } of one.solids) met.add(kind);
          expect(Number.isFinite(table.errorL)).toBe(true);
          let last = 0;
          for (const { volumeL, surfaceCm2, centroidMm } of table.rows) {
            expect(volumeL).toBeGreaterThanOrEqual(last - 1e-9 * table.capacityL);
            expect(volumeL).toBeLessThanOrEqual(table.capacityL);
            expect([surfaceCm2, ...centroidMm].every(Number.isFinite)).toBe(true);
            last = volumeL;
          }
        } catch (error) {
          if (!(error instanceof DipwrightError)) throw error;
          expect(error.code).toBe('invalid');
          expect(error.message).toMatch(/\.$/);
        }
      }),
      { numRuns: 250, seed: 7 },
    );
    expect(computed).toBeGreaterThan(40);
    expect([...met].sort()).toEqual(kinds.map(({ kind }) => kind).sort());
  });

  it('200 solids are computed and judged in good time', async () => {
    const many = design(
      Array.from({ length: 200 }, (_, i) =>
        box(`b${i}`, [11, 50, 20 + (i % 7)], { at: [10 * i, 0, i % 3] }),
      ),
    );
    const { capacityL } = await computeTable(many, { stepMm: 1 });
    expect(capacityL).toBeGreaterThan(1.9);
    expect(await checkIssuable(many)).toEqual([]);
  });
});
