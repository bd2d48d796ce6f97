import { describe, expect, it } from 'vitest';
import { edgesOf, edgesSeenFrom } from '~/viewport/drawn-edges';

/** A closed prism with `n` sides about the x axis, flat ends fanned from their centres. */
function prism(n: number) {
  const positions: number[] = [0, 0, 0, 10, 0, 0];
  for (let i = 0; i < n; i += 1) {
    const a = (2 * Math.PI * (i + 0.5)) / n;
    positions.push(0, Math.cos(a), Math.sin(a), 10, Math.cos(a), Math.sin(a));
  }
  const triangles: number[] = [];
  for (let i = 0; i < n; i += 1) {
    const a = 2 + 2 * i;
    const b = 2 + 2 * ((i + 1) % n);
    triangles.push(a, b, b + 1, a, b + 1, a + 1, 0, b, a, 1, a + 1, b + 1);
  }
  return {
    positions: Float64Array.from(positions),
    triangles: Uint32Array.from(triangles),
  };
}

describe('edges that a draughtsman draws', () => {
  it('are the twelve of a box, not the diagonals of its faces', () => {
    const edges = edgesOf(prism(4));
    expect(edges.crease.reduce((sum, one) => sum + one, 0)).toBe(12);
  });

  it('are the two rims of a round barrel and its outline from the side', () => {
    const edges = edgesOf(prism(48));
    expect(edges.crease.reduce((sum, one) => sum + one, 0)).toBe(2 * 48);
    const seen = edgesSeenFrom(edges, [0, -1, 0]);
    expect(seen.length / 6).toBe(2 * 48 + 2);
  });
});
