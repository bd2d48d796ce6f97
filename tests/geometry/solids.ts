import { circleOutline } from '~/geometry/circle';
import { loadManifold, spaceOf } from '~/geometry/manifold';
import type { PlacedShape } from '~/geometry/placed-shape';
import type { Mesh } from '~/geometry/mesh';
import { placing } from '~/geometry/placing';
import type { Axis } from '~/geometry/shape';
import type { Vec3 } from '~/geometry/vec3';

await loadManifold();

export function boxShape(size: Vec3, at: Vec3 = [0, 0, 0], turn: Vec3 = [0, 0, 0]): PlacedShape {
  const [x, y, z] = [size[0] / 2, size[1] / 2, size[2]];
  const outline = [
    [-x, -y],
    [x, -y],
    [x, y],
    [-x, y],
  ] as const;
  return {
    shape: { form: 'extrusion', axis: 'z', outline, length: z },
    place: placing(at, size, turn),
  };
}

export function cylinderShape(
  radius: number,
  length: number,
  facets: number,
  { axis = 'z' as Axis, at = [0, 0, 0] as Vec3, phase = 0 } = {},
): PlacedShape {
  const extent = [2 * radius, 2 * radius, 2 * radius] as [number, number, number];
  extent['xyz'.indexOf(axis)] = length;
  const outline = circleOutline(radius, facets, phase);
  return {
    shape: { form: 'extrusion', axis, outline, length },
    place: placing(at, extent, [0, 0, 0]),
  };
}

export function meshFrom(
  holds: PlacedShape[],
  displaces: PlacedShape[] = [],
  origin: Vec3 = [0, 0, 0],
): Mesh {
  return spaceOf(holds, displaces, origin);
}

/** Corner at the origin and edges a, b, c along x, y, z. */
export function cornerTetrahedron(a: number, b: number, c: number): Mesh {
  return {
    positions: Float64Array.of(0, 0, 0, a, 0, 0, 0, b, 0, 0, 0, c),
    triangles: Uint32Array.of(0, 2, 1, 0, 1, 3, 0, 3, 2, 1, 2, 3),
  };
}
