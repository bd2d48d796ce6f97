import { meshCaps, spacedCount } from './mesh-caps';
import { MeshFileError } from './mesh-file-error';

/** Gives every place a number; the same three numbers are the same place. */
export interface VertexWelder {
  /** The number of this place, a new one where it was not seen before. */
  add(x: number, y: number, z: number): number;
  /** x, y, z of every place, in the order of their numbers. */
  positions(): Float64Array;
}

/** Exact welding by a hash of the doubles' bits: about 0.1 µs a vertex. Throws past the cap of vertices. */
export function vertexWelder(): VertexWelder {
  let places = new Float64Array(3 * 1024);
  let count = 0;
  let slots = new Int32Array(4096);
  const exact = new Float64Array(3);
  const bits = new Uint32Array(exact.buffer);
  // nobody can prepare a file whose places all fall into one slot
  const seed = Math.floor(Math.random() * 2 ** 32) | 1;

  return {
    add(x, y, z) {
      // + 0 makes one of the two zeros
      let slot = slotOf(x + 0, y + 0, z + 0);
      for (;;) {
        const known = slots[slot]! - 1;
        if (known < 0) break;
        if (places[3 * known] === x && places[3 * known + 1] === y && places[3 * known + 2] === z) {
          return known;
        }
        slot = (slot + 1) & (slots.length - 1);
      }
      if (count === meshCaps.vertices) {
        throw new MeshFileError(
          `The file has more than ${spacedCount(meshCaps.vertices)} different corners, the most that is taken: write a coarser mesh.`,
        );
      }
      if (3 * count === places.length) places = grown(places);
      places.set([x + 0, y + 0, z + 0], 3 * count);
      count += 1;
      slots[slot] = count;
      if (2 * count > slots.length) rehash();
      return count - 1;
    },
    positions: () => places.slice(0, 3 * count),
  };

  function slotOf(x: number, y: number, z: number): number {
    exact[0] = x;
    exact[1] = y;
    exact[2] = z;
    let hash = seed;
    for (let i = 0; i < 6; i += 1) {
      hash = Math.imul(hash ^ bits[i]!, 0x9e3779b1);
      hash ^= hash >>> 15;
    }
    return hash & (slots.length - 1);
  }

  function rehash(): void {
    slots = new Int32Array(4 * slots.length);
    for (let known = 0; known < count; known += 1) {
      let slot = slotOf(places[3 * known]!, places[3 * known + 1]!, places[3 * known + 2]!);
      while (slots[slot] !== 0) slot = (slot + 1) & (slots.length - 1);
      slots[slot] = known + 1;
    }
  }
}

function grown(array: Float64Array): Float64Array<ArrayBuffer> {
  const larger = new Float64Array(2 * array.length);
  larger.set(array);
  return larger;
}
