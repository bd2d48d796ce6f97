import { describe, expect, it } from 'vitest';
import { barrelProfile } from '~/geometry/barrel-profile';
import type { Head } from '~/geometry/head';
import { leastGap } from '~/geometry/head-gap';

const radius = 100;
const ball: Head = { form: 'dish', radius, depth: 100 };
const cone: Head = { form: 'cone', radius, depth: 100 };

describe('ends that are deep in the same direction', () => {
  it('stand as far apart as the barrel is long where they are alike', () => {
    const gap = leastGap({ head: ball, inward: true }, { head: ball, inward: false }, 7);
    expect(gap.mm).toBeCloseTo(7, 12);
  });

  it('may come nearest off the axis', () => {
    // hemisphere √(1 − x²) over cone 1 − x: farthest from it at x = √½, by √2 − 1 of the radius
    const gap = leastGap({ head: ball, inward: true }, { head: cone, inward: false }, 50);
    expect(gap.mm).toBeCloseTo(50 - 100 * (Math.SQRT2 - 1), 9);
    expect(gap.r).toBeCloseTo(100 * Math.SQRT1_2, 4);
  });

  it('are drawn with more chords where the usual ones would cross', () => {
    // crowns of 100 and 101 mm, one over the other: 0.02 mm apart on the axis when the barrel is 9.07 mm long
    const torisphere: Head = { form: 'torisphere', radius, crown: 101, knuckle: 50 };
    const profile = (length: number) =>
      barrelProfile(
        { head: ball, inward: true, mouth: 0 },
        { head: torisphere, inward: false, mouth: length },
        32,
      );
    const gap = leastGap({ head: ball, inward: true }, { head: torisphere, inward: false }, 9.07);
    expect(gap.mm).toBeGreaterThan(0.01);
    expect(gap.mm).toBeLessThan(0.021);
    const [far, near] = [profile(30), profile(9.07)];
    expect(near.length).toBeGreaterThan(3 * far.length);
    // the lower outline stays below the upper one: every vertex of it, on the chord above it
    const turn = near.findIndex(([r], i) => r === radius && near[i + 1]![0] === radius);
    const [below, above] = [near.slice(0, turn + 1), near.slice(turn + 1).reverse()];
    for (const [r, z] of below) {
      const after = Math.max(
        above.findIndex(([other]) => other >= r),
        1,
      );
      const [r0, z0] = above[after - 1]!;
      const [r1, z1] = above[after]!;
      expect(z).toBeLessThan(z0 + ((r - r0) / (r1 - r0)) * (z1 - z0));
    }
  });
});

describe('ends turned towards each other', () => {
  it('come nearest on the axis', () => {
    const gap = leastGap({ head: cone, inward: true }, { head: ball, inward: true }, 230);
    expect(gap.mm).toBeCloseTo(30, 9);
    expect(gap.r).toBeCloseTo(0, 4);
  });
});
