import { describe, expect, it } from 'vitest';
import { patchTwist, loftVolume, type Loft } from '~/geometry/loft';
import { crossingBetween } from '~/geometry/loft-crossing';
import { flatFacesOf } from '~/geometry/loft-faces';
import { lineInLoft } from '~/geometry/line-in-loft';
import { isTwisted, loftMesh } from '~/geometry/loft-mesh';
import { enclosedVolume } from '~/geometry/mesh';
import type { Vec2 } from '~/geometry/shape';

const square = (half: number): Vec2[] => [
  [-half, -half],
  [half, -half],
  [half, half],
  [-half, half],
];
/** One corner of the far end pulled out: the two sides that meet in it are twisted. */
const pulled: Loft = {
  x: [0, 100],
  sections: [
    square(50),
    [
      [-50, -50],
      [50, -50],
      [80, 90],
      [-50, 50],
    ],
  ],
};

describe('a bilinear patch', () => {
  it('stands off a plane by its twist', () => {
    expect(
      patchTwist([
        [0, 0, 0],
        [0, 10, 0],
        [10, 10, 0],
        [10, 0, 0],
      ]),
    ).toBe(0);
    expect(
      patchTwist([
        [0, 0, 0],
        [0, 10, 0],
        [10, 10, 3],
        [10, 0, 0],
      ]),
    ).toBeCloseTo(3 / Math.hypot(1, 0.15, 0.15), 1);
  });

  it('a cell fanned about the mean of its corners encloses the mean of its two foldings', () => {
    // corner heights 0, 0, h, 0 over a square a × a: foldings hold h a²/3 and h a²/6, the bilinear cell h a²/4
    const [a, h] = [10, 6];
    const fold = [(h * a * a) / 3, (h * a * a) / 6];
    const bilinear = (h * a * a) / 4;
    expect((fold[0]! + fold[1]!) / 2).toBeCloseTo(bilinear, 12);
    // four triangles about the middle at h/4: two with heights 0, 0, h/4 and two with 0, h, h/4
    const fan = ((a * a) / 4) * (2 * (h / 4 / 3) + 2 * ((h + h / 4) / 3));
    expect(fan).toBeCloseTo(bilinear, 12);
  });
});

describe('loftMesh', () => {
  it('encloses the volume that Simpson gives, whatever the facets, and doubles with them', () => {
    expect(isTwisted(pulled)).toBe(true);
    const counts = [32, 64, 128].map((facets) => {
      const mesh = loftMesh(pulled, facets);
      expect(enclosedVolume(mesh) / loftVolume(pulled)).toBeCloseTo(1, 13);
      return mesh.triangles.length / 3;
    });
    expect(counts[2]).toBeGreaterThan(3 * counts[1]!);
  });

  it('wants no more than twelve triangles for a box, and has six flat faces', () => {
    const box: Loft = { x: [0, 100], sections: [square(50), square(50)] };
    expect(isTwisted(box)).toBe(false);
    expect(loftMesh(box, 512).triangles).toHaveLength(36);
    expect(flatFacesOf(box)).toHaveLength(6);
    expect(flatFacesOf(pulled)).toHaveLength(4);
  });
});

describe('crossingBetween', () => {
  it('finds none between sections that answer each other', () => {
    expect(crossingBetween(square(50), square(10))).toBeNull();
    expect(crossingBetween(square(50), pulled.sections[1]!)).toBeNull();
    // a corner in the middle of a straight side stays there
    const five: Vec2[] = [
      [-50, -50],
      [0, -50],
      [50, -50],
      [50, 50],
      [-50, 50],
    ];
    expect(
      crossingBetween(
        five,
        five.map(([y, z]): Vec2 => [y / 2, z / 2]),
      ),
    ).toBeNull();
  });

  it('finds the half turn, where all is one point halfway', () => {
    const turned = square(50).map(([y, z]): Vec2 => [-y, -z]);
    expect(crossingBetween(square(50), turned)?.share).toBeCloseTo(0.5, 12);
  });

  it('finds a corner that runs through a side only on the way', () => {
    // the tooth passes over the post that stands beside it and comes to stand at its other side
    const before: Vec2[] = [
      [0, 0],
      [100, 0],
      [100, 10],
      [80, 10],
      [70, 30],
      [60, 10],
      [40, 10],
      [30, 30],
      [20, 10],
      [0, 10],
    ];
    const after = before.map(([y, z], j): Vec2 => (j === 7 ? [75, 14] : [y, z]));
    const found = crossingBetween(before, after);
    expect(found).not.toBeNull();
    expect(found!.corner).toBe(7);
    expect(found!.share).toBeGreaterThan(0);
    expect(found!.share).toBeLessThan(1);
  });
});

describe('lineInLoft', () => {
  it('meets a twisted side where its straight lines run', () => {
    // halfway along, the pulled corner stands at (65, 70): the upper side falls from there to (−50, 50)
    const at = (y: number) => 50 + (20 * (y + 50)) / 115;
    for (const y of [-20, 0, 40]) {
      const [stretch] = lineInLoft({ origin: [50, y, -500], direction: [0, 0, 1] }, pulled, 0);
      expect(stretch!.from).toBeCloseTo(450, 9);
      expect(stretch!.to).toBeCloseTo(500 + at(y), 9);
    }
  });

  it('runs along a flat side within the slack, from end to end', () => {
    const line = { origin: [-300, 0, -50], direction: [1, 0, 0] } as const;
    expect(lineInLoft(line, pulled, 2e-6)).toEqual([{ from: 300, to: 400 }]);
    expect(lineInLoft(line, pulled, -2e-6)).toEqual([]);
  });
});
