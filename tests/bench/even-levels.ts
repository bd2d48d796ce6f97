import { levels, type Mesh } from '~/geometry/mesh';
import type { Vec3 } from '~/geometry/vec3';

/** So many levels u·p evenly between the lowest and the highest vertex of a mesh, both left out. */
export function evenLevels(mesh: Mesh, up: Vec3, rows: number): Float64Array {
  let low = Infinity;
  let high = -Infinity;
  for (const level of levels(mesh, up)) {
    low = Math.min(low, level);
    high = Math.max(high, level);
  }
  return Float64Array.from({ length: rows }, (_, i) => low + ((high - low) * (i + 1)) / (rows + 1));
}
