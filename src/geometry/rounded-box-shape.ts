import { outlinePolygon } from './outline-polygon';
import type { RoundedBox } from './rounded-box';
import { roundedBoxMesh } from './rounded-box-mesh';
import { axisOrder, type Shape, type Vec2 } from './shape';
import { samePlaceMm } from './tolerance';
import type { Vec3 } from './vec3';

/** How a rounded box is made, of exactly its volume, `facets` chords to a turn; extruded where its rims are sharp. */
export function roundedBoxShape(box: RoundedBox, facets: number): Shape {
  const { axis, size, corner, rim } = box;
  if (rim > 0) return { form: 'mesh', mesh: roundedBoxMesh(box, facets), flat: flatFaces(box) };
  const [x, y] = [size[0] / 2, size[1] / 2];
  const corners: Vec2[] = [
    [-x, -y],
    [x, -y],
    [x, y],
    [-x, y],
  ];
  const radii = [corner, corner, corner, corner];
  const { points, straight } = outlinePolygon({ corners, radii }, facets);
  return { form: 'extrusion', axis, outline: points, length: size[2], flat: straight };
}

/** The faces of which rounding leaves more than a line. */
function flatFaces({ axis, size, corner, rim }: RoundedBox) {
  const left = [size[0] - 2 * corner, size[1] - 2 * corner, size[2] - 2 * rim].map(
    (length) => length > samePlaceMm,
  );
  return axisOrder(axis).flatMap((own, i) => {
    const across = [0, 1, 2].filter((other) => other !== i);
    if (!across.every((other) => left[other])) return [];
    return [1, -1].map((sign) => {
      const normal: [number, number, number] = [0, 0, 0];
      normal[own] = sign;
      return { normal: normal as Vec3, offset: size[i]! / 2 };
    });
  });
}
