import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { headDepth, type Head } from '~/geometry/head';
import { headHeight } from '~/geometry/head-height';
import { headProfile } from '~/geometry/head-profile';
import { headSupport } from '~/geometry/head-support';
import { headVolume } from '~/geometry/head-volume';
import { lineInHead } from '~/geometry/line-in-head';
import { unit } from '~/geometry/vec3';

const heads: readonly (readonly [string, Head])[] = [
  ['cone', { form: 'cone', radius: 200, depth: 130 }],
  ['dish', { form: 'dish', radius: 200, depth: 60 }],
  ['nearly flat dish', { form: 'dish', radius: 200, depth: 0.5 }],
  ['hemisphere', { form: 'dish', radius: 200, depth: 200 }],
  ['ellipsoid', { form: 'ellipsoid', radius: 200, depth: 100 }],
  ['deep ellipsoid', { form: 'ellipsoid', radius: 200, depth: 500 }],
  ['torisphere', { form: 'torisphere', radius: 200, crown: 400, knuckle: 24 }],
  ['torisphere of a wide knuckle', { form: 'torisphere', radius: 200, crown: 240, knuckle: 190 }],
  ['torisphere of a huge crown', { form: 'torisphere', radius: 200, crown: 9e4, knuckle: 20 }],
  ['torisphere without a knuckle', { form: 'torisphere', radius: 200, crown: 200, knuckle: 50 }],
];

/** ∫ of a function of an end's height by circles, r = radius·sin t: smooth at the rim as well. */
function overCircles(head: Head, integrand: (r: number, height: number) => number): number {
  const n = 20_000;
  let sum = 0;
  for (let i = 0; i < n; i += 1) {
    const t = ((i + 0.5) / n) * (Math.PI / 2);
    const r = head.radius * Math.sin(t);
    sum += integrand(r, headHeight(head, r)) * head.radius * Math.cos(t);
  }
  return (sum * Math.PI) / 2 / n;
}

describe('a torispherical end', () => {
  it('with f = 1, k = 0.06 of 108 in is 18.288462 in deep, 0.169338 D (V2.06)', () => {
    // ChEDL fluids.geometry a_torispherical (C. Bell), after D. Jones, "Calculating Tank Volume"
    const depth = headDepth({ form: 'torisphere', radius: 54, crown: 108, knuckle: 6.48 });
    expect(depth).toBeCloseTo(18.288462, 6);
    expect(depth / 108).toBeCloseTo(0.169338, 6);
  });

  it('with crown and knuckle of the radius is a hemisphere', () => {
    const head: Head = { form: 'torisphere', radius: 200, crown: 200, knuckle: 199.999 };
    expect(headDepth(head)).toBeCloseTo(200, 10);
    expect(headVolume(head)).toBeCloseTo((2 / 3) * Math.PI * 200 ** 3, 5);
  });

  it('without a knuckle to speak of is a dish of the crown', () => {
    const head: Head = { form: 'torisphere', radius: 200, crown: 325, knuckle: 1e-9 };
    const depth = 325 - Math.sqrt(325 ** 2 - 200 ** 2);
    expect(headDepth(head)).toBeCloseTo(depth, 6);
    expect(headVolume(head) / headVolume({ form: 'dish', radius: 200, depth })).toBeCloseTo(1, 8);
  });
});

describe.each(heads)('%s', (_, head) => {
  const depth = headDepth(head);

  it('has the volume of its circles, and its depth on the axis', () => {
    const volume = overCircles(head, (r, height) => 2 * Math.PI * r * height);
    expect(volume / headVolume(head)).toBeCloseTo(1, 6);
    expect(headHeight(head, 0)).toBeCloseTo(depth, 10);
    expect(headHeight(head, head.radius)).toBeCloseTo(0, 9);
  });

  it('has the support of its circles', () => {
    for (let degrees = 0; degrees <= 180; degrees += 3.7) {
      const angle = (degrees * Math.PI) / 180;
      const [across, along] = [Math.sin(angle), Math.cos(angle)];
      let greatest = -Infinity;
      for (let i = 0; i <= 4000; i += 1) {
        const r = head.radius * Math.sin(((i / 4000) * Math.PI) / 2);
        greatest = Math.max(greatest, across * r + along * headHeight(head, r));
      }
      const support = headSupport(head, across, along);
      expect(support - greatest).toBeGreaterThan(-1e-9);
      expect(support - greatest).toBeLessThan(1e-3);
    }
  });

  it('is cut by any line where the line passes its surface or the mouth', () => {
    const part = fc.double({ min: -1, max: 1, noNaN: true });
    const isIn = ([x, y, z]: readonly number[]) => {
      const r = Math.hypot(x!, y!);
      return r < head.radius && z! > 0 && z! < headHeight(head, r);
    };
    let hit = 0;
    fc.assert(
      fc.property(fc.tuple(part, part, part), fc.tuple(part, part, part), (through, towards) => {
        const direction = unit(
          Math.hypot(...towards) > 0.1 ? (towards as [number, number, number]) : [1, 0, 0],
        );
        const origin = [
          through[0] * head.radius,
          through[1] * head.radius,
          ((through[2] + 1) / 2) * depth,
        ] as const;
        const at = (t: number) => origin.map((value, axis) => value + t * direction[axis]!);
        const stretch = lineInHead({ origin, direction }, head, 0);
        const reach = 3 * (head.radius + depth);
        for (let i = 0; i < 400; i += 1) {
          const t = (i / 200 - 1) * reach;
          const near = Math.min(
            Math.abs((stretch?.from ?? 1e9) - t),
            Math.abs((stretch?.to ?? 1e9) - t),
          );
          if (near < 1e-6) continue;
          const inside = stretch !== null && t > stretch.from && t < stretch.to;
          expect(isIn(at(t))).toBe(inside);
        }
        if (!stretch || stretch.to - stretch.from < 1e-3) return;
        hit += 1;
        expect(isIn(at(stretch.from + 1e-5))).toBe(true);
        expect(isIn(at(stretch.to - 1e-5))).toBe(true);
        expect(isIn(at(stretch.from - 1e-5))).toBe(false);
        expect(isIn(at(stretch.to + 1e-5))).toBe(false);
      }),
      { numRuns: 60, seed: 7 },
    );
    expect(hit).toBeGreaterThan(20);
  });
});

describe.each(heads.slice(1))('the half outline of a %s', (_, head) => {
  const depth = headDepth(head);

  it.each([32, 48, 64, 128, 256, 512])(
    'turned at %s facets encloses exactly its volume',
    (facets) => {
      const profile = headProfile(head, facets);
      expect(turnedBelow(profile, depth) / headVolume(head)).toBeCloseTo(1, 11);
      expect(profile[0]).toEqual([0, depth]);
      expect(profile.at(-1)).toEqual([head.radius, 0]);
      profile.slice(1).forEach(([r, z], i) => {
        const [r0, z0] = profile[i]!;
        // outwards and downwards all the way: nothing stands out beyond tip and rim
        expect(r).toBeGreaterThan(r0);
        expect(z).toBeLessThan(z0);
      });
    },
  );

  it('has twice as many chords at twice the facets', () => {
    const chords = (facets: number) => headProfile(head, facets).length - 1;
    expect(chords(128)).toBe(2 * chords(64));
    expect(chords(256)).toBe(4 * chords(64));
    expect(chords(48) * 4).toBe(chords(64) * 3);
  });

  it('errs about an eighth as much in the part filled when facets double', () => {
    const worst = (facets: number) => {
      const profile = headProfile(head, facets);
      let greatest = 0;
      for (let i = 1; i < 200; i += 1) {
        const level = (i / 200) * depth;
        const part = overCircles(head, (r, height) => 2 * Math.PI * r * Math.min(height, level));
        greatest = Math.max(greatest, Math.abs(turnedBelow(profile, level) - part));
      }
      // against a barrel as long as its radius
      return greatest / (Math.PI * head.radius ** 3);
    };
    const [coarse, fine] = [worst(64), worst(128)];
    expect(coarse / fine).toBeGreaterThan(7);
    expect(fine).toBeLessThan(2.5e-6);
  });
});

/** Volume of a turned outline up to a level, mm³: frusta, the last of them cut. */
function turnedBelow(profile: readonly (readonly [number, number])[], level: number): number {
  let sum = 0;
  for (let i = 1; i < profile.length; i += 1) {
    const [r0, z0] = profile[i - 1]!;
    const [r1, z1] = profile[i]!;
    const top = Math.min(z0, level);
    if (top <= z1) continue;
    const rTop = r1 + ((r0 - r1) * (top - z1)) / (z0 - z1);
    sum += (Math.PI / 3) * (rTop * rTop + rTop * r1 + r1 * r1) * (top - z1);
  }
  return sum;
}
