import type { Mesh } from '../mesh';
import type { Vec3 } from '../vec3';

/** Least x, y, z and the lengths along them; zeros for a mesh without vertices. */
export function boundsOf({ positions }: Pick<Mesh, 'positions'>): { low: Vec3; size: Vec3 } {
  if (positions.length === 0) return { low: [0, 0, 0], size: [0, 0, 0] };
  const low: [number, number, number] = [Infinity, Infinity, Infinity];
  const high: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  for (let i = 0; i < positions.length; i += 3) {
    for (let axis = 0; axis < 3; axis += 1) {
      const value = positions[i + axis]!;
      if (value < low[axis]!) low[axis] = value;
      if (value > high[axis]!) high[axis] = value;
    }
  }
  return { low, size: [high[0] - low[0], high[1] - low[1], high[2] - low[2]] };
}
