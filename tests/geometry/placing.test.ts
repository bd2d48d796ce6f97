import { describe, expect, it } from 'vitest';
import { upVector } from '~/geometry/attitude';
import { directionToOwn, placing, toOwn, toTank } from '~/geometry/placing';

describe('placing', () => {
  it('puts the lowest corner of an unturned box at `at`', () => {
    const place = placing([10, 20, 30], [100, 200, 300], [0, 0, 0]);
    expect(toTank(place, [-50, -100, -150])).toEqual([10, 20, 30]);
    expect(toTank(place, [50, 100, 150])).toEqual([110, 220, 330]);
  });

  it('turns about x first, then y, then z, about the centre of the box', () => {
    const place = placing([0, 0, 0], [2, 2, 2], [90, 0, 90]);
    // own y → (x first) z, which the turn about z leaves alone; own z → −y → x
    expect(toTank(place, [0, 1, 0])).toEqual([1, 1, 2]);
    expect(toTank(place, [0, 0, 1])).toEqual([2, 1, 1]);
  });

  it('keeps right angles exact, whichever way they are written', () => {
    for (const turn of [270, -90]) {
      expect(placing([0, 0, 0], [4, 2, 2], [0, 0, turn]).aligned).toBe(true);
      expect(toTank(placing([0, 0, 0], [4, 2, 2], [0, 0, turn]), [2, 0, 0])).toEqual([2, -1, 1]);
    }
    expect(placing([0, 0, 0], [4, 2, 2], [0, 0, 45]).aligned).toBe(false);
  });

  it('makes faces that should meet equal to the last bit', () => {
    const below = placing([0, 0, 0.1], [1, 1, 0.2], [0, 0, 0]);
    const above = placing([0, 0, 0.3], [1, 1, 0.7], [0, 0, 0]);
    expect(toTank(below, [0, 0, 0.1])[2]).toBe(toTank(above, [0, 0, -0.35])[2]);
  });

  it('comes back', () => {
    const place = placing([5, -7, 11], [30, 40, 50], [10, 20, 30]);
    const there = toTank(place, [1, 2, 3]);
    toOwn(place, there).forEach((value, i) => expect(value).toBeCloseTo(i + 1, 12));
    const up = directionToOwn(place, [0, 0, 1]);
    expect(Math.hypot(...up)).toBeCloseTo(1, 14);
  });
});

describe('upVector', () => {
  it('is exactly z when level', () => expect(upVector(0, 0)).toEqual([0, 0, 1]));

  it('leans away from the lower end', () => {
    const up = upVector(10, 0);
    expect(up[0]).toBeLessThan(0);
    expect(up[0] / up[2]).toBeCloseTo(-Math.tan(Math.PI / 18), 14);
    expect(upVector(0, 5)[1]).toBeLessThan(0);
  });
});
