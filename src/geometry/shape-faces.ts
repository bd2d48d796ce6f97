import { axisOrder, type Shape } from './shape';
import type { Vec3 } from './vec3';

/** Flat faces as rounds of vertices, against the clock from outside. */
export interface ShapeFaces {
  points: readonly Vec3[];
  faces: readonly (readonly number[])[];
}

/** The faces of a shape in its own frame; those of a turned body are not asked for. */
export function shapeFaces(shape: Exclude<Shape, { form: 'revolution' }>): ShapeFaces {
  return shape.form === 'mesh' ? ofMesh(shape.mesh) : ofExtrusion(shape);
}

function ofMesh({ positions, triangles }: Extract<Shape, { form: 'mesh' }>['mesh']): ShapeFaces {
  const points: Vec3[] = [];
  for (let i = 0; i < positions.length; i += 3) {
    points.push([positions[i]!, positions[i + 1]!, positions[i + 2]!]);
  }
  const faces: number[][] = [];
  for (let t = 0; t < triangles.length; t += 3) {
    faces.push([triangles[t]!, triangles[t + 1]!, triangles[t + 2]!]);
  }
  return { points, faces };
}

function ofExtrusion({ outline, axis, length }: Extract<Shape, { form: 'extrusion' }>): ShapeFaces {
  const [first, second, third] = axisOrder(axis);
  const n = outline.length;
  const points = [-length / 2, length / 2].flatMap((end) =>
    outline.map(([a, b]): Vec3 => {
      const own: [number, number, number] = [0, 0, 0];
      own[first] = a;
      own[second] = b;
      own[third] = end;
      return own;
    }),
  );
  const round = outline.map((_, i) => i);
  const sides = round.map((i) => [i, (i + 1) % n, n + ((i + 1) % n), n + i]);
  return { points, faces: [[...round].reverse(), round.map((i) => n + i), ...sides] };
}
