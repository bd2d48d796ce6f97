import { describe, expect, it } from 'vitest';
import { circleOutline, ellipseOutline, facetPhase } from '~/geometry/circle';
import type { Vec2 } from '~/geometry/shape';

function area(outline: readonly Vec2[]): number {
  return outline.reduce((sum, [x, y], i) => {
    const [x2, y2] = outline[(i + 1) % outline.length]!;
    return sum + (x * y2 - x2 * y) / 2;
  }, 0);
}

describe('round outlines', () => {
  it.each([16, 64, 512])('enclose exactly the true area with %s corners', (facets) => {
    expect(area(circleOutline(300, facets, 0.3)) / (Math.PI * 300 ** 2)).toBeCloseTo(1, 13);
    expect(area(ellipseOutline(300, 200, facets, 0.3)) / (Math.PI * 300 * 200)).toBeCloseTo(1, 13);
  });

  it('have a corner at the lowest line of a lying cylinder', () => {
    // outline of axis x is (y, z)
    expect(facetPhase('x', [1, 0, 0], [0, 0, 1])).toBeCloseTo(-Math.PI / 2, 15);
    // upright: the tank's x
    expect(facetPhase('z', [1, 0, 0], [0, 0, 1])).toBe(0);
  });

  it('stand the same however the solid was turned into place', () => {
    // axis x turned by −90° about y stands upright; the tank's x is then own −z
    const lyingTurnedUp = facetPhase('x', [0, 0, -1], [1, 0, 0]);
    // own (y, z) at that phase points along own −z, which is the tank's x
    expect(Math.cos(lyingTurnedUp)).toBeCloseTo(0, 15);
    expect(Math.sin(lyingTurnedUp)).toBeCloseTo(-1, 15);
  });
});
