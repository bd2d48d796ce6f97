import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kindOf, kinds, type Solid } from '~/domain/tank/kinds/registry';
import { highestLevel, placedShape, placedSolid } from '~/domain/tank/placed-solid';
import { loadManifold, meshOf } from '~/geometry/manifold';
import { enclosedVolume, levels } from '~/geometry/mesh';
import { unit } from '~/geometry/vec3';
import { flatSolids } from './flat-solids';
import { cylindersWithEnds } from './cylinders-with-ends';

await loadManifold();

const angle = fc.double({ min: -180, max: 180, noNaN: true });
const part = fc.double({ min: -1, max: 1, noNaN: true });
const direction = fc
  .tuple(part, part, part)
  .filter(([x, y, z]) => Math.hypot(x, y, z) > 0.1)
  .map(unit);

/** Options that the blanks do not show. */
const withOptions: readonly Solid[] = [...cylindersWithEnds, ...flatSolids];

/** Every kind at odd sizes, along every axis it may have. */
const blanks = kinds.flatMap((kind): Solid[] => {
  const blank = kind.blank('it');
  return 'axis' in blank
    ? ['x', 'y', 'z']
        .map((axis) => ({ ...blank, axis }) as Solid)
        .filter((one) => kind.schema.safeParse(one).success)
    : [blank];
});
const examples = [...blanks, ...withOptions];

describe.each(examples.map((solid) => [kindOf(solid).words(solid), solid] as const))(
  '%s',
  (_, example) => {
    const kind = kindOf(example);

    it('has a blank that its own schema takes, without faults', () => {
      expect(kind.schema.parse(example)).toEqual(example);
      expect(kind.faults(example)).toEqual([]);
      for (const { path } of kind.sizes(example)) expect(path.length).toBeGreaterThan(0);
    });

    it('has a closed mesh of its exact volume, inside its box', () => {
      const mesh = meshOf(placedShape(placedSolid(example), 128), [0, 0, 0]);
      expect(enclosedVolume(mesh) / kind.volume(example)).toBeCloseTo(1, 8);
      const edges = new Map<string, number>();
      for (let n = 0; n < mesh.triangles.length; n += 1) {
        const from = mesh.triangles[n]!;
        const to = mesh.triangles[n % 3 === 2 ? n - 2 : n + 1]!;
        const key = `${Math.min(from, to)} ${Math.max(from, to)}`;
        edges.set(key, (edges.get(key) ?? 0) + (from < to ? 1 : -1));
      }
      expect([...edges.values()].every((balance) => balance === 0)).toBe(true);
      kind.extent(example).forEach((length, axis) => {
        const along = mesh.positions.filter((_, i) => i % 3 === axis);
        const slack =
          ((kind.curved(example) === 'twice' ? 4 : 2) * Math.max(...kind.extent(example))) /
          128 ** 2;
        expect(Math.min(...along)).toBeGreaterThan(-slack);
        expect(Math.max(...along)).toBeLessThan(length + slack);
      });
    });

    it('has the support and the chords of its mesh, however it is turned', () => {
      fc.assert(
        fc.property(fc.tuple(angle, angle, angle), direction, (turn, up) => {
          const placed = placedSolid({ ...example, turn: turn as [number, number, number] });
          const mesh = meshOf(placedShape(placed, 128), [0, 0, 0]);
          const size = Math.max(...kind.extent(example));
          const top = Math.max(...levels(mesh, up));
          expect(Math.abs(highestLevel(placed, up) - top)).toBeLessThan(
            (4 * size) / 128 ** 2 + 1e-6,
          );
        }),
        { numRuns: 25, seed: 4 },
      );
    });

    it('has chords that add up to its volume', () => {
      const [x, y] = kind.extent(example);
      const n = 200;
      let sum = 0;
      for (let i = 0; i < n; i += 1) {
        for (let j = 0; j < n; j += 1) {
          const origin = [((i + 0.5) / n - 0.5) * x, ((j + 0.5) / n - 0.5) * y, -1e4] as const;
          for (const { from, to } of kind.chords(example, { origin, direction: [0, 0, 1] }, 0))
            sum += to - from;
        }
      }
      expect((sum * x * y) / n / n / kind.volume(example)).toBeCloseTo(1, 2);
    });
  },
);
