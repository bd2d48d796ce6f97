/** Positions rounded to 32 bits, no two alike, and the way back from a rounded place to its vertex. */
export interface DistinctRounded {
  rounded: Float32Array;
  /** Index of the vertex with exactly this rounded place; throws when there is none. */
  vertexAt(x: number, y: number, z: number): number;
}

/**
 * Vertices that would round to the same place (a fine facet on a tank of many metres) are set apart by the
 * smallest steps of z that 32 bits know.
 */
export function distinctRounded(positions: Float64Array): DistinctRounded {
  const rounded = Float32Array.from(positions);
  const byPlace = new Map<string, number>();
  const bits = new Float32Array(1);
  const pattern = new Int32Array(bits.buffer);
  for (let vertex = 0; vertex < rounded.length / 3; vertex += 1) {
    let key = keyOf(rounded[3 * vertex]!, rounded[3 * vertex + 1]!, rounded[3 * vertex + 2]!);
    while (byPlace.has(key)) {
      bits[0] = rounded[3 * vertex + 2]!;
      pattern[0]! += 1;
      rounded[3 * vertex + 2] = bits[0];
      key = keyOf(rounded[3 * vertex]!, rounded[3 * vertex + 1]!, bits[0]);
    }
    byPlace.set(key, vertex);
  }
  return {
    rounded,
    vertexAt(x, y, z) {
      const vertex = byPlace.get(keyOf(x, y, z));
      if (vertex === undefined) throw new Error('the mesh library moved a vertex it was given');
      return vertex;
    },
  };
}

function keyOf(x: number, y: number, z: number): string {
  // + 0 makes one of the two zeros
  return `${x + 0} ${y + 0} ${z + 0}`;
}
