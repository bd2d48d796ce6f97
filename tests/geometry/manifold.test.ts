import { describe, expect, it } from 'vitest';
import { enclosedVolume } from '~/geometry/mesh';
import { shells } from '~/geometry/shells';
import { upVector } from '~/geometry/attitude';
import { sweep } from '~/geometry/sweep';
import { boxShape, cylinderShape, meshFrom } from './solids';

describe('spaceOf', () => {
  it('hands out doubles: a tank 20 m from the origin loses nothing', () => {
    const size = [900.123456, 500.654321, 300.111111] as const;
    const far = meshFrom([boxShape(size, [20_000.7, -20_000.3, 20_000.1], [0, 0, 15])]);
    const exact = size[0] * size[1] * size[2];
    expect(Math.abs(enclosedVolume(far, [20_000, -20_000, 20_000]) / exact - 1)).toBeLessThan(
      1e-12,
    );
    const moved = meshFrom(
      [boxShape(size, [20_000.7, -20_000.3, 20_000.1], [0, 0, 15])],
      [],
      [20_450, -19_750, 20_250],
    );
    const near = meshFrom([boxShape(size, [0.7, -0.3, 0.1], [0, 0, 15])], [], [450, 250, 250]);
    const up = upVector(5, 3);
    const at = Float64Array.of(-60, 0, 60);
    const [a, b] = [sweep(moved, up, at).volume, sweep(near, up, at).volume];
    a.forEach((volume, row) => expect(Math.abs(volume - b[row]!) / exact).toBeLessThan(1e-11));
  });

  it('is exact where faces coincide: box on box, identical parts, cuts right through', () => {
    const one = boxShape([100, 100, 100]);
    expect(enclosedVolume(meshFrom([one, one]))).toBe(1e6);
    const stacked = meshFrom([one, boxShape([100, 100, 50], [0, 0, 100])]);
    expect(enclosedVolume(stacked)).toBe(1.5e6);
    expect(shells(stacked)).toHaveLength(1);
    const through = meshFrom([one], [boxShape([20, 100, 100], [40, 0, 0])]);
    expect(enclosedVolume(through)).toBe(800_000);
    expect(shells(through)).toHaveLength(2);
  });

  it('is empty when all is displaced', () => {
    const nothing = meshFrom([boxShape([100, 100, 100])], [boxShape([100, 100, 100])]);
    expect(nothing.triangles).toHaveLength(0);
    expect(sweep(nothing, [0, 0, 1], Float64Array.of(0, 1)).volume[1]).toBe(0);
  });

  it('keeps chambers apart that only share an edge', () => {
    const parts = shells(
      meshFrom([boxShape([100, 100, 100]), boxShape([100, 100, 100], [100, 100, 0])]),
    );
    expect(parts.map(({ volumeMm3 }) => volumeMm3)).toEqual([1e6, 1e6]);
  });

  it('gives an enclosed void a shell of negative volume', () => {
    const hollow = shells(
      meshFrom([boxShape([100, 100, 100])], [boxShape([20, 20, 20], [40, 40, 40])]),
    );
    expect(hollow.map(({ volumeMm3 }) => volumeMm3).sort((a, b) => a - b)).toEqual([-8000, 1e6]);
  });

  it('keeps facets of equal round surfaces together', () => {
    const part = cylinderShape(300, 500, 128);
    const whole = meshFrom([part, cylinderShape(300, 500, 128, { at: [0, 0, 250] })]);
    expect(enclosedVolume(whole) / (Math.PI * 300 ** 2 * 750)).toBeCloseTo(1, 9);
  });
});
