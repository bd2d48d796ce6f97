import { erodedMesh } from './eroded-mesh';
import { meshOf, outlinesLess } from './manifold';
import type { Mesh } from './mesh';
import type { Placing } from './placing';
import type { Shape, Vec2 } from './shape';
import { movedOut } from './swollen';
import { along, cross, dot, type Vec3 } from './vec3';

const ownFrame: Placing = {
  centre: [0, 0, 0],
  rows: [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  aligned: false,
};

/**
 * The inward offset of a shape by `wallMm`, in the same frame; null when nothing is left. Along an extrusion's
 * axis and in a meridian plane of a body of revolution the nearest place of the surface lies in the same section,
 * so both are offset as flat outlines; anything else as a mesh. `facets` chords to a turn round re-entrant
 * edges. Needs loadManifold() first.
 */
export function erodedShape(shape: Shape, wallMm: number, facets: number): Shape | null {
  if (shape.form === 'extrusion') {
    const length = shape.length - 2 * wallMm;
    if (!(length > 0)) return null;
    return gathered(outlinesLess([shape.outline], wallMm, facets, false).map(clean), (outline) => ({
      ...shape,
      outline,
      length,
    }));
  }
  if (shape.form === 'revolution' && shape.stretch.every((factor) => factor === 1)) {
    return gathered(
      outlinesLess([shape.profile], wallMm, facets, true).map(clean).map(ontoAxis),
      (profile) => ({ ...shape, profile }),
    );
  }
  const drawn = meshOf({ shape, place: ownFrame }, [0, 0, 0]);
  const smooth = shape.form === 'revolution' ? smoothlyMovedIn(drawn, wallMm) : null;
  const mesh = smooth ?? erodedMesh(drawn, wallMm, (2 * Math.PI) / facets);
  return mesh.triangles.length === 0 ? null : { form: 'mesh', mesh };
}

/** An ellipsoid with its corners moved in along their normals; null where it is bent more sharply than the wall is thick. */
function smoothlyMovedIn(drawn: Mesh, wallMm: number): Mesh | null {
  const mesh = movedOut({ form: 'mesh', mesh: drawn }, -wallMm);
  const normalOf = ({ positions: p, triangles: t }: Mesh, n: number): Vec3 => {
    const [a, b, c] = [0, 1, 2].map((k): Vec3 => {
      const i = 3 * t[n + k]!;
      return [p[i]!, p[i + 1]!, p[i + 2]!];
    }) as [Vec3, Vec3, Vec3];
    return cross(along(b, a, -1), along(c, a, -1));
  };
  for (let n = 0; n < drawn.triangles.length; n += 3) {
    if (!(dot(normalOf(drawn, n), normalOf(mesh, n)) > 0)) return null;
  }
  return mesh;
}

/** One outline stays a shape of its form; several, which the wall has parted, are one mesh of loose parts. */
function gathered(
  outlines: readonly (readonly Vec2[])[],
  shapeOf: (outline: readonly Vec2[]) => Shape,
) {
  const shapes = outlines.filter((outline) => outline.length >= 3).map(shapeOf);
  if (shapes.length <= 1) return shapes[0] ?? null;
  const meshes = shapes.map((shape) => meshOf({ shape, place: ownFrame }, [0, 0, 0]));
  return { form: 'mesh', mesh: together(meshes) } as const;
}

function together(meshes: readonly Mesh[]): Mesh {
  const positions: number[] = [];
  const triangles: number[] = [];
  for (const mesh of meshes) {
    const first = positions.length / 3;
    for (const value of mesh.positions) positions.push(value);
    for (const vertex of mesh.triangles) triangles.push(first + vertex);
  }
  return { positions: Float64Array.from(positions), triangles: Uint32Array.from(triangles) };
}

/** Without corners nearer than 1e-6 mm to the one before: rounding of the offset, not shape. */
function clean(outline: readonly Vec2[]): Vec2[] {
  return outline.filter(([a, b], i) => {
    const [before, at] = outline[(i + outline.length - 1) % outline.length]!;
    return Math.hypot(a - before, b - at) > 1e-6;
  });
}

function ontoAxis(profile: readonly Vec2[]): Vec2[] {
  return profile.map(([radius, place]) => [radius < 1e-7 ? 0 : radius, place]);
}
