import type { Mesh } from './mesh';
import { toTank, type Placing } from './placing';
import type { Vec3 } from './vec3';

/** A mesh of a solid's own frame in the tank's frame moved by −origin, mm. */
export function placedMesh({ positions, triangles }: Mesh, place: Placing, origin: Vec3): Mesh {
  const placed = new Float64Array(positions.length);
  for (let i = 0; i < placed.length; i += 3) {
    const point = toTank(place, [positions[i]!, positions[i + 1]!, positions[i + 2]!]);
    for (let axis = 0; axis < 3; axis += 1) placed[i + axis] = point[axis]! - origin[axis]!;
  }
  return { positions: placed, triangles };
}
