/** Positions rounded to 32 bits, no two alike, and the way back from a rounded place to its vertex. */
export interface DistinctRounded {
  rounded: Float32Array;
  /** Index of the vertex with exactly this rounded place; throws when there is none. */
  vertexAt(x: number, y: number, z: number): number;
}

/**
 * Vertices that would round to the same place (a fine facet on a tank of many metres) are set apart by the
 * smallest steps of z that 32 bits know. By a hash of the three bit patterns: about 0.1 µs a vertex.
 */
export function distinctRounded(positions: Float64Array): DistinctRounded {
  const rounded = Float32Array.from(positions);
  const size = 2 ** Math.max(4, Math.ceil(Math.log2(positions.length / 3 + 1)) + 1);
  const slots = new Int32Array(size);
  // the pattern of z last given out instead of a place that was taken, so that a crowd costs no second search
  const lastInstead = new Map<number, number>();
  const place = new Float32Array(3);
  const pattern = new Int32Array(place.buffer);
  const seed = Math.floor(Math.random() * 2 ** 32) | 1;

  for (let vertex = 0; vertex < rounded.length / 3; vertex += 1) {
    let slot = find(rounded[3 * vertex]!, rounded[3 * vertex + 1]!, rounded[3 * vertex + 2]!);
    if (slots[slot] !== 0) {
      const taken = slot;
      pattern[2] = lastInstead.get(taken) ?? pattern[2]!;
      do {
        pattern[2]! += 1;
        slot = find(place[0]!, place[1]!, place[2]!);
      } while (slots[slot] !== 0);
      lastInstead.set(taken, pattern[2]!);
      rounded[3 * vertex + 2] = place[2]!;
    }
    slots[slot] = vertex + 1;
  }
  return {
    rounded,
    vertexAt(x, y, z) {
      const vertex = slots[find(x, y, z)]! - 1;
      if (vertex < 0) throw new Error('the mesh library moved a vertex it was given');
      return vertex;
    },
  };

  /** The slot of the vertex that has this place, or the free one where it belongs. Leaves it in `place`. */
  function find(x: number, y: number, z: number): number {
    // + 0 makes one of the two zeros
    place[0] = x + 0;
    place[1] = y + 0;
    place[2] = z + 0;
    let hash = seed;
    for (let i = 0; i < 3; i += 1) {
      hash = Math.imul(hash ^ pattern[i]!, 0x9e3779b1);
      hash ^= hash >>> 15;
    }
    for (let slot = hash & (size - 1); ; slot = (slot + 1) & (size - 1)) {
      const known = slots[slot]! - 1;
      if (
        known < 0 ||
        (rounded[3 * known]! + 0 === place[0] &&
          rounded[3 * known + 1]! + 0 === place[1] &&
          rounded[3 * known + 2]! + 0 === place[2])
      ) {
        return slot;
      }
    }
  }
}
