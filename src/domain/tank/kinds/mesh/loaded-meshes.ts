import { invalid } from '../../../errors';
import { enclosedVolume, type Mesh } from '../../../../geometry/mesh';
import { boundsOf } from '../../../../geometry/mesh-import/bounds';
import { meshLines, type MeshLines } from '../../../../geometry/mesh-lines';
import type { Vec3 } from '../../../../geometry/vec3';
import type { MeshSolid } from './schema';

/** A mesh that solids of this process may name, in its file's own numbers. */
export interface LoadedMesh {
  mesh: Mesh;
  /** Middle of its box and the box's lengths along x, y, z. */
  middle: Vec3;
  size: Vec3;
  volume: number;
  /** Lines through it along a unit vector; the last few directions are kept. */
  linesAlong(direction: Vec3): MeshLines;
}

/** Most triangles of all meshes that one design may name: a table of so many takes seconds. */
export const mostNamedTriangles = 2_000_000;

/** Most that are kept; those not used for longest go first. More than a design may name. */
const mostKeptTriangles = 3_000_000;
const mostDirections = 4;

// shared by every design of the process: an id is a hash of what the mesh holds, a path is used once
const meshes = new Map<string, LoadedMesh>();

/** Lets solids name a closed, outward mesh (see importMesh) by `upload`. */
export function provideMesh(upload: string, mesh: Mesh): void {
  meshes.delete(upload);
  meshes.set(upload, loaded(mesh));
  let kept = 0;
  for (const [name, one] of [...meshes].reverse()) {
    kept += one.mesh.triangles.length / 3;
    if (kept > mostKeptTriangles && name !== upload) meshes.delete(name);
  }
}

/** Whether solids may name it; counts as a use of it. */
export function hasMesh(upload: string): boolean {
  const found = meshes.get(upload);
  if (!found) return false;
  meshes.delete(upload);
  meshes.set(upload, found);
  return true;
}

/** The mesh that a solid names. Throws `invalid`, naming the solid, when it was not provided. */
export function loadedMesh({ id, upload }: Pick<MeshSolid, 'id' | 'upload'>): LoadedMesh {
  const found = meshes.get(upload);
  if (!found) throw invalid('/solids', `Solid "${id}", upload: ${notLoaded}`);
  return found;
}

/** What is said of a solid whose mesh is not there. */
export const notLoaded = 'there is no such mesh here: upload its file again.';

function loaded(mesh: Mesh): LoadedMesh {
  const { low, size } = boundsOf(mesh);
  const byDirection = new Map<string, MeshLines>();
  return {
    mesh,
    middle: [low[0] + size[0] / 2, low[1] + size[1] / 2, low[2] + size[2] / 2],
    size,
    volume: enclosedVolume(mesh, low),
    linesAlong(direction) {
      const key = direction.join(' ');
      let lines = byDirection.get(key);
      if (!lines) {
        lines = meshLines(mesh, direction);
        byDirection.set(key, lines);
        const [oldest] = byDirection.keys();
        if (byDirection.size > mostDirections) byDirection.delete(oldest!);
      }
      return lines;
    },
  };
}
