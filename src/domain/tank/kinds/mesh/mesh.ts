import { thinMm } from '../../../../geometry/tolerance';
import type { Vec3 } from '../../../../geometry/vec3';
import { invalid } from '../../../errors';
import { greatestLengthMm } from '../../solid';
import type { Kind } from '../kind';
import { sizeWords } from '../size-words';
import { chordsInMesh } from './chords';
import { hasMesh, loadedMesh, notLoaded } from './loaded-meshes';
import { meshSchema, type MeshSolid } from './schema';
import { factorsOf, type StretchedMesh } from './stretched';

/**
 * A closed triangle mesh from an STL or OBJ file; its faces are taken as flat as they are written. Needs its mesh
 * provided first (loaded-meshes.ts). No size of it can be typed, but what was measured are its lengths along x, y
 * and z, so each of them has the ± of a size, as those of a box would.
 */
export const mesh: Kind<MeshSolid> = {
  kind: 'mesh',
  label: 'mesh',
  schema: meshSchema,
  curved: () => false,
  extent,
  axes: null,
  sizes: () => [],
  measured: (solid) =>
    (['length', 'width', 'height'] as const).map((name, axis) => {
      const lengthMm = () => extent(solid)[axis]!;
      return {
        path: [name],
        // asked only where the mesh is loaded: pages and prints want no more than the names
        get sizeMm() {
          return lengthMm();
        },
        grown: (byMm: number): MeshSolid => {
          const stretch: [number, number, number] = [1, 1, 1];
          stretch[axis] = (lengthMm() + byMm) / lengthMm();
          const stretched: StretchedMesh = { ...solid, stretch };
          return stretched;
        },
      };
    }),
  words: (solid) =>
    hasMesh(solid.upload) ? `mesh of ${sizeWords(...extent(solid))}` : 'mesh not loaded',
  shape(solid) {
    const { mesh: taken, middle } = loadedMesh(solid);
    const factors = factorsOf(solid);
    const positions = new Float64Array(taken.positions.length);
    for (let i = 0; i < positions.length; i += 3) {
      for (let axis = 0; axis < 3; axis += 1) {
        positions[i + axis] = (taken.positions[i + axis]! - middle[axis]!) * factors[axis]!;
      }
    }
    // a copy: what is made of it may be handed to another thread, which takes it from here
    return { form: 'mesh', mesh: { positions, triangles: taken.triangles.slice() } };
  },
  support(solid, up) {
    const {
      mesh: { positions },
      middle,
    } = loadedMesh(solid);
    const [fx, fy, fz] = factorsOf(solid);
    const [x, y, z] = [up[0] * fx, up[1] * fy, up[2] * fz];
    let most = -Infinity;
    for (let i = 0; i < positions.length; i += 3) {
      const level =
        x * (positions[i]! - middle[0]) +
        y * (positions[i + 1]! - middle[1]) +
        z * (positions[i + 2]! - middle[2]);
      if (level > most) most = level;
    }
    return most;
  },
  chords: (solid, line, slack) => chordsInMesh(loadedMesh(solid), factorsOf(solid), line, slack),
  volume(solid) {
    const [x, y, z] = factorsOf(solid);
    return loadedMesh(solid).volume * x * y * z;
  },
  eroded({ id }) {
    throw invalid(
      '/wall/sizes',
      `Wall, sizes: outside sizes are not computed with a mesh (solid "${id}"): model the inside, and give inside sizes.`,
    );
  },
  faults(solid) {
    if (!hasMesh(solid.upload)) return [{ path: ['upload'], detail: notLoaded }];
    const lengths = extent(solid);
    if (Math.max(...lengths) > greatestLengthMm) {
      return [
        {
          path: ['scale'],
          detail: `at this scale the mesh is ${sizeWords(...lengths)} mm, and a length is at most 100 000 mm: choose the unit that the file was drawn in.`,
        },
      ];
    }
    if (Math.min(...lengths) < thinMm) {
      return [
        {
          path: ['scale'],
          detail: `at this scale the mesh is ${sizeWords(...lengths)} mm, and a size is at least ${thinMm} mm: choose the unit that the file was drawn in.`,
        },
      ];
    }
    return [];
  },
  blank: (id) => ({ id, role: 'holds', kind: 'mesh', upload: '', scale: 1 }),
};

function extent(solid: MeshSolid): Vec3 {
  const { size } = loadedMesh(solid);
  const [x, y, z] = factorsOf(solid);
  return [size[0] * x, size[1] * y, size[2] * z];
}
