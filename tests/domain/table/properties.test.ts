import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { levelRows } from '~/domain/table/level-rows';
import { liquidSpace } from '~/domain/table/liquid-space';
import { readingFrame } from '~/domain/table/reading-frame';
import { parseDesign } from '~/domain/tank/parse-design';
import { placedSolid } from '~/domain/tank/placed-solid';
import { loadManifold } from '~/geometry/manifold';
import { enclosedVolume } from '~/geometry/mesh';
import type { PlainSolid } from '../../support/membership';
import { plainSolid, plainTank, plainKinds, type PlainDesign } from '../../support/plain-tanks';

await loadManifold();

const facets = 48;
/** What the grid of 1e-6 mm may cost a tank of 80 mm, part of its capacity. */
const snapping = 1e-7;
const shares = [0, 0.02, 0.1, 0.3, 0.5, 0.77, 0.97, 1];

/** The litres of a tank at shares of its plumb height; null when nothing of it is left. */
function litres(tank: PlainDesign, at: readonly number[] = shares) {
  const document = parseDesign(tank);
  const solids = document.solids.map(placedSolid);
  try {
    const space = liquidSpace(solids, facets);
    const frame = readingFrame(document, solids, space);
    const rows = levelRows(
      space,
      frame,
      at.map((share) => share * frame.heightMm),
    );
    return {
      space,
      frame,
      rows,
      capacityL: space.volumeMm3 / 1e6,
      volumes: rows.map(({ volumeL }) => volumeL),
    };
  } catch (error) {
    if (/is empty/.test(String(error))) return null;
    throw error;
  }
}

/** Litres below a plumb level of the tank's frame. */
function below(tank: PlainDesign, levelMm: number): number {
  const found = litres(tank, []);
  if (!found) return 0;
  const { space, frame, capacityL } = found;
  if (levelMm <= frame.lowestLevelMm) return 0;
  if (levelMm >= frame.highestLevelMm) return capacityL;
  return levelRows(space, frame, [levelMm - frame.lowestLevelMm])[0]!.volumeL;
}

const check = (property: (tank: PlainDesign) => void, numRuns = 25, tanks = plainTank(3)) =>
  fc.assert(fc.property(tanks, property), { numRuns, seed: 20, endOnFailure: true });

const scaled = (tank: PlainDesign, factor: number): PlainDesign => ({
  ...tank,
  solids: tank.solids.map((solid) => times(solid, factor) as PlainSolid),
});

/** Every length of a solid's entry times a factor; angles stay. */
function times(value: unknown, factor: number, key = ''): unknown {
  if (key === 'turn') return value;
  if (typeof value === 'number') return value * factor;
  if (Array.isArray(value)) return value.map((one) => times(one, factor));
  if (typeof value === 'object' && value !== null) {
    return Object.fromEntries(
      Object.entries(value).map(([name, one]) => [name, times(one, factor, name)]),
    );
  }
  return value;
}

describe('of any tank', { timeout: 120_000 }, () => {
  it('litres rise with the reading, from nothing to the volume of the mesh', () => {
    check((tank) => {
      const found = litres(tank);
      if (!found) return;
      const { volumes, capacityL, space, rows } = found;
      volumes.forEach((volume, i) => {
        if (i > 0) expect(volume).toBeGreaterThanOrEqual(volumes[i - 1]! - 1e-12 * capacityL);
      });
      expect(volumes[0]).toBe(0);
      expect(volumes.at(-1)).toBe(capacityL);
      expect(capacityL).toBe(enclosedVolume(space.mesh) / 1e6);
      for (const row of rows) {
        expect([row.surfaceCm2, row.wettedCm2, ...row.centroidMm].every(Number.isFinite)).toBe(
          true,
        );
        expect(Math.min(row.surfaceCm2, row.wettedCm2)).toBeGreaterThanOrEqual(0);
      }
    });
  });

  it('a cut parts it into two that add up to it', () => {
    check((tank) => {
      const cut = (side: number): PlainDesign => ({
        ...tank,
        solids: [
          ...tank.solids,
          {
            id: 'cut',
            role: 'displaces',
            kind: 'box',
            length: 10_000,
            width: 10_000,
            height: 10_000,
            at: [side < 0 ? -10_000 + 37 : 37, -5000, -5000],
          },
        ],
      });
      const whole = litres(tank);
      if (!whole) return;
      const { lowestLevelMm, highestLevelMm } = whole.frame;
      for (const share of [0.2, 0.6, 1]) {
        const level = lowestLevelMm + share * (highestLevelMm - lowestLevelMm);
        const parts = below(cut(-1), level) + below(cut(1), level);
        expect(Math.abs(parts - below(tank, level)) / whole.capacityL).toBeLessThan(1e-9);
      }
    });
  });

  it('turning tank and gravity together changes nothing', () => {
    const yaw = fc.constantFrom(90, 180, 33.3, -127);
    fc.assert(
      fc.property(plainTank(3), yaw, (tank, degrees) => {
        const turned = turnedAbout(tank, degrees);
        const [one, other] = [litres(tank), litres(turned)];
        if (!one || !other) return;
        expect(other.frame.heightMm).toBeCloseTo(one.frame.heightMm, 6);
        // facets of an upright round solid stay where the tank's x points, so they differ by what facets err
        const tolerance = degrees % 90 === 0 ? snapping : 5e-4;
        other.volumes.forEach((volume, i) => {
          expect(Math.abs(volume - one.volumes[i]!) / one.capacityL).toBeLessThan(tolerance);
        });
      }),
      { numRuns: 25, seed: 8, endOnFailure: true },
    );
  });

  it('the same tank many times larger or a thousand times smaller holds the cube of that', () => {
    check((tank) => {
      const one = litres(tank);
      if (!one) return;
      for (const factor of [50, 0.001]) {
        const other = litres(scaled(tank, factor));
        other!.volumes.forEach((volume, i) => {
          const apart = Math.abs(volume / factor ** 3 - one.volumes[i]!) / one.capacityL;
          // a thousandth stands on a snapping grid a thousand times coarser
          expect(apart).toBeLessThan(factor < 1 ? 1000 * snapping : snapping);
        });
      }
    }, 15);
  });

  it('seen in a mirror it holds the same, tilted the other way', () => {
    const tanks = fc.constantFrom(...plainKinds).chain((kind) => plainSolid(kind, 'holds', false));
    fc.assert(
      fc.property(tanks, fc.double({ min: 1, max: 40, noNaN: true }), (solid, pitch) => {
        const tank = (turn: number[], attitude: { pitch: number; roll: number }): PlainDesign => ({
          format: 'dipwright-tank',
          version: 1,
          name: 'it',
          solids: [{ ...solid, turn }],
          attitude,
        });
        // half a turn about z and the opposite pitch are the same tank seen from the other side
        const one = litres(tank([0, 0, 0], { pitch, roll: 0 }))!;
        const other = litres(tank([0, 0, 180], { pitch: -pitch, roll: 0 }))!;
        other.volumes.forEach((volume, i) => {
          expect(Math.abs(volume - one.volumes[i]!) / one.capacityL).toBeLessThan(snapping);
        });
      }),
      { numRuns: 30, seed: 3, endOnFailure: true },
    );
  });

  it('the order of its solids is of no matter', () => {
    check(
      (tank) => {
        const [one, other] = [
          litres(tank),
          litres({ ...tank, solids: [...tank.solids].reverse() }),
        ];
        expect(other === null).toBe(one === null);
        other?.volumes.forEach((volume, i) => {
          expect(Math.abs(volume - one!.volumes[i]!) / one!.capacityL).toBeLessThan(1e-9);
        });
      },
      25,
      plainTank(4),
    );
  });

  it('what displaces never adds, what holds never takes away', () => {
    const more = fc.constantFrom(...plainKinds).chain((kind) => plainSolid(kind, 'displaces'));
    fc.assert(
      fc.property(plainTank(2), more, (tank, extra) => {
        const whole = litres(tank);
        if (!whole) return;
        const { lowestLevelMm, highestLevelMm } = whole.frame;
        const solid = { ...extra, id: 'more' };
        const less = { ...tank, solids: [...tank.solids, solid] };
        const greater = { ...tank, solids: [...tank.solids, { ...solid, role: 'holds' }] };
        for (const share of [0.1, 0.5, 0.9, 1]) {
          const level = lowestLevelMm + share * (highestLevelMm - lowestLevelMm);
          const now = below(tank, level);
          expect(below(less, level)).toBeLessThanOrEqual(now + snapping * whole.capacityL);
          expect(below(greater, level)).toBeGreaterThanOrEqual(now - snapping * whole.capacityL);
        }
      }),
      { numRuns: 20, seed: 12, endOnFailure: true },
    );
  });
});

/** The whole tank and its gravity turned about z. */
function turnedAbout(tank: PlainDesign, degrees: number): PlainDesign {
  const quarter = degrees / 90;
  const exact = [
    [1, 0],
    [0, 1],
    [-1, 0],
    [0, -1],
  ] as const;
  const radians = (degrees * Math.PI) / 180;
  const [c, s] = Number.isInteger(quarter)
    ? exact[((quarter % 4) + 4) % 4]!
    : [Math.cos(radians), Math.sin(radians)];
  const document = parseDesign(tank);
  const t = (angle = 0) => Math.tan((angle * Math.PI) / 180);
  const [px, py] = [t(tank.attitude?.pitch), t(tank.attitude?.roll)];
  const back = (slope: number) => (Math.atan(slope) * 180) / Math.PI;
  return {
    ...tank,
    solids: tank.solids.map((solid, i) => {
      const [x, y] = placedSolid(document.solids[i]!).place.centre;
      const at = solid.at as number[];
      const [tx, ty, tz] = (solid.turn as number[] | undefined) ?? [0, 0, 0];
      return {
        ...solid,
        at: [at[0]! + c * x - s * y - x, at[1]! + s * x + c * y - y, at[2]!],
        turn: [tx!, ty!, tz! + degrees > 360 ? tz! + degrees - 360 : tz! + degrees],
      };
    }),
    attitude: { pitch: back(c * px - s * py), roll: back(s * px + c * py) },
  };
}
