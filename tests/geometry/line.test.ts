import { describe, expect, it } from 'vitest';
import { unionOf, without } from '~/geometry/intervals';
import { lineInHalfSpaces, lineInQuadric } from '~/geometry/line';

describe('lines through solids', () => {
  const slab = [
    { normal: [0, 0, 1], offset: 10 },
    { normal: [0, 0, -2], offset: 0 },
    { normal: [1, 0, 0], offset: 5 },
  ] as const;

  it('cuts half-spaces, whatever the length of their normals', () => {
    expect(lineInHalfSpaces({ origin: [0, 0, 3], direction: [0, 0, 1] }, slab, 0)).toEqual({
      from: -3,
      to: 7,
    });
    expect(lineInHalfSpaces({ origin: [6, 0, 3], direction: [0, 0, 1] }, slab, 0)).toBeNull();
  });

  it('counts a line along a face as inside, or as outside when asked', () => {
    const alongFace = { origin: [5, 0, 0], direction: [0, 0, 1] } as const;
    expect(lineInHalfSpaces(alongFace, slab, 1e-6)).not.toBeNull();
    expect(lineInHalfSpaces(alongFace, slab, -1e-6)).toBeNull();
  });

  it('cuts ellipsoids and cylinders', () => {
    const whole = lineInQuadric({ origin: [0, 0, 0], direction: [0, 0, 1] }, [3, 4, 5], 0)!;
    expect(whole.from).toBeCloseTo(-5, 12);
    expect(whole.to).toBeCloseTo(5, 12);
    const chord = lineInQuadric(
      { origin: [0, 3, -100], direction: [0, 0, 1] },
      [Infinity, 5, 5],
      0,
    )!;
    expect(chord.from).toBeCloseTo(96, 10);
    expect(chord.to).toBeCloseTo(104, 10);
    expect(
      lineInQuadric({ origin: [0, 0, 6], direction: [1, 0, 0] }, [Infinity, 5, 5], 0),
    ).toBeNull();
    expect(lineInQuadric({ origin: [0, 0, 1], direction: [1, 0, 0] }, [Infinity, 5, 5], 0)).toEqual(
      {
        from: -Infinity,
        to: Infinity,
      },
    );
  });
});

describe('stretches', () => {
  it('join where they touch and lose what is taken away', () => {
    const joined = unionOf(
      [
        { from: 5, to: 9 },
        { from: 0, to: 2 },
        { from: 2 + 1e-7, to: 4 },
      ],
      1e-6,
    );
    expect(joined).toEqual([
      { from: 0, to: 4 },
      { from: 5, to: 9 },
    ]);
    expect(without(joined, [{ from: 1, to: 6 }])).toEqual([
      { from: 0, to: 1 },
      { from: 6, to: 9 },
    ]);
    expect(without(joined, [{ from: -1, to: 4 - 1e-7 }], 1e-6)).toEqual([{ from: 5, to: 9 }]);
  });
});
