import type { Mesh } from '../mesh';
import { meshCaps, spacedCount } from './mesh-caps';
import { MeshFileError } from './mesh-file-error';
import { vertexWelder } from './vertex-welder';

/** A mesh as it grows while its file is read; memory grows with what was really read. */
export interface MeshBuilder {
  /** `where`: the line or triangle, for a sentence. Throws when a number cannot be a place. */
  vertex(x: number, y: number, z: number, where: () => string): number;
  /** Corners by the numbers that vertex() gave. Throws past the cap. */
  triangle(i: number, j: number, k: number): void;
  mesh(): Mesh;
}

export function meshBuilder(): MeshBuilder {
  const welder = vertexWelder();
  let triangles = new Uint32Array(3 * 1024);
  let count = 0;
  return {
    vertex(x, y, z, where) {
      for (const value of [x, y, z]) {
        if (!(Math.abs(value) <= meshCaps.number)) {
          throw new MeshFileError(
            `${where()}: a coordinate is a number within ± 1 000 000 000, not ${value}.`,
          );
        }
      }
      return welder.add(x, y, z);
    },
    triangle(i, j, k) {
      if (count === meshCaps.triangles) throw tooManyTriangles();
      if (3 * count === triangles.length) {
        const larger = new Uint32Array(2 * triangles.length);
        larger.set(triangles);
        triangles = larger;
      }
      triangles[3 * count] = i;
      triangles[3 * count + 1] = j;
      triangles[3 * count + 2] = k;
      count += 1;
    },
    mesh: () => ({ positions: welder.positions(), triangles: triangles.slice(0, 3 * count) }),
  };
}

export function tooManyTriangles(): MeshFileError {
  return new MeshFileError(
    `The file has more than ${spacedCount(meshCaps.triangles)} triangles, the most that is taken: write a coarser mesh.`,
  );
}
