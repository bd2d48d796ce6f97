import { loadManifold, libraryRefusal } from '../manifold';
import { enclosedVolume, shifted, type Mesh } from '../mesh';
import type { Vec3 } from '../vec3';
import { boundsOf } from './bounds';
import { MeshFileError } from './mesh-file-error';
import { meshFaults } from './mesh-faults';
import type { MeshFormat } from './mesh-format';
import { readMesh, type Pieces } from './read-mesh';

/** A mesh file taken in: closed, outward, fit to be joined with other solids. */
export interface ImportedMesh {
  mesh: Mesh;
  format: MeshFormat;
  /** Lengths along x, y, z, in the file's own unit. */
  size: Vec3;
  /** In that unit, cubed. */
  volume: number;
  /** What was mended, one sentence each. */
  notes: readonly string[];
}

/**
 * Reads and checks a mesh file. Throws a MeshFileError, one sentence a fault, for what cannot be read, is too
 * large, or encloses no space; see readMesh and meshFaults. Loads the mesh library.
 */
export async function importMesh(
  pieces: Pieces,
  totalBytes: number | null = null,
): Promise<ImportedMesh> {
  const { mesh: raw, format } = await readMesh(pieces, totalBytes);
  const { mesh, notes, faults } = meshFaults(raw);
  if (faults.length > 0) throw new MeshFileError(...(faults as [string, ...string[]]));
  await loadManifold();
  const { low, size } = boundsOf(mesh);
  // the way a solid goes in: about its own middle
  const refusal = libraryRefusal(
    shifted(mesh, [-low[0] - size[0] / 2, -low[1] - size[1] / 2, -low[2] - size[2] / 2]),
  );
  if (refusal !== null) throw new MeshFileError(refusal);
  return { mesh, format, size, volume: enclosedVolume(mesh, low), notes };
}
