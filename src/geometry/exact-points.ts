import type { Vec2 } from './shape';

/**
 * Looks up the point of an outline that a rounded copy (within 1e-7 mm) came from: the mesh library keeps
 * flat outlines on a grid of about 7e-9 mm. Throws when there is none.
 */
export function exactPoints(outline: readonly Vec2[]): (a: number, b: number) => Vec2 {
  const sorted = [...outline].sort((one, other) => one[0] - other[0]);
  return (a, b) => {
    let low = 0;
    let high = sorted.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (sorted[middle]![0] < a - 1e-7) low = middle + 1;
      else high = middle;
    }
    for (let i = low; i < sorted.length && sorted[i]![0] <= a + 1e-7; i += 1) {
      if (Math.abs(sorted[i]![1] - b) <= 1e-7) return sorted[i]!;
    }
    throw new Error('the mesh library made a vertex that is not in the outline');
  };
}
