import type { Mesh } from './mesh';
import type { Placing } from './placing';
import { snap } from './tolerance';
import type { Vec3 } from './vec3';

/** A mesh of a solid's own frame in the tank's frame moved by −origin, mm; see toTank, here for many points. */
export function placedMesh({ positions, triangles }: Mesh, place: Placing, origin: Vec3): Mesh {
  const placed = new Float64Array(positions.length);
  for (let axis = 0; axis < 3; axis += 1) {
    const [rx, ry, rz] = place.rows[axis]!;
    const centre = place.centre[axis]!;
    const from = origin[axis]!;
    for (let i = 0; i < placed.length; i += 3) {
      const value = centre + rx * positions[i]! + ry * positions[i + 1]! + rz * positions[i + 2]!;
      placed[i + axis] = (place.aligned ? snap(value) : value) - from;
    }
  }
  return { positions: placed, triangles };
}
