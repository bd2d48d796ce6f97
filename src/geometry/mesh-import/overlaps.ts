import type { Mesh } from '../mesh';
import { meshLines } from '../mesh-lines';
import type { Vec3 } from '../vec3';
import { boundsOf } from './bounds';

/** Lines a side of the grid that is looked through, along each axis. */
const side = 96;

/**
 * A place where a closed mesh holds the same space more than once, or less than never: bodies that overlap, a
 * surface that crosses itself. Looked for along 96 × 96 lines in each of three directions, so what is narrower than
 * about a hundredth of the whole may be missed. null when none is found.
 */
export function overlapPlace(mesh: Mesh): Vec3 | null {
  const { low, size } = boundsOf(mesh);
  const noise = 1e-6 * Math.max(...size);
  for (let axis = 0; axis < 3; axis += 1) {
    const direction = [0, 1, 2].map((i) => (i === axis ? 1 : 0)) as unknown as Vec3;
    const lines = meshLines(mesh, direction);
    const [u, v] = [(axis + 1) % 3, (axis + 2) % 3];
    for (let i = 0; i < side * side; i += 1) {
      // off the middle, where models tend to have edges
      const at: [number, number, number] = [...low];
      at[u]! += (size[u]! * ((i % side) + 0.4142)) / side;
      at[v]! += (size[v]! * (Math.floor(i / side) + 0.7321)) / side;
      const crossings = lines.crossings(at);
      let winding = 0;
      for (let n = 0; n + 1 < crossings.length; n += 1) {
        winding += crossings[n]!.into;
        const [from, to] = [crossings[n]!.level, crossings[n + 1]!.level];
        if ((winding > 1 || winding < 0) && to - from > noise) {
          at[axis] = (from + to) / 2;
          return at;
        }
      }
    }
  }
  return null;
}
