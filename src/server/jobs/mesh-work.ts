import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { readFile, stat } from 'node:fs/promises';
import { DipwrightError, invalid } from '~/domain/errors';
import { hasMesh, provideMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { importMesh } from '~/geometry/mesh-import/import-mesh';
import { bytesOfMesh, meshOfBytes } from '~/geometry/mesh-import/mesh-bytes';
import { MeshFileError } from '~/geometry/mesh-import/mesh-file-error';

/** A kept mesh that a design names, as a file of this machine. */
export interface MeshFile {
  upload: string;
  file: string;
}

/** What came of a file that was sent. */
export interface AcceptedMesh {
  /** As it is kept (mesh-bytes.ts), and the SHA-256 of that, hexadecimal. */
  bytes: Uint8Array;
  hash: string;
  triangles: number;
  /** In the file's own unit, and that cubed. */
  size: readonly [number, number, number];
  volume: number;
  notes: readonly string[];
}

/** Reads and checks a file that was sent. Throws `invalid`, one fault a sentence. */
export async function acceptMesh(file: string): Promise<AcceptedMesh> {
  try {
    const { size: length } = await stat(file);
    const { mesh, size, volume, notes } = await importMesh(createReadStream(file), length);
    const bytes = bytesOfMesh(mesh);
    const hash = createHash('sha256').update(bytes).digest('hex');
    return { bytes, hash, triangles: mesh.triangles.length / 3, size: [...size], volume, notes };
  } catch (error) {
    if (!(error instanceof MeshFileError)) throw error;
    const faults = error.sentences.map((detail) => ({ pointer: '', detail }));
    throw faults.length === 1
      ? invalid('', error.message)
      : new DipwrightError('invalid', error.message, { faults });
  }
}

/** Makes the meshes of a design known to this thread; those it knows already are not read again. */
export async function loadMeshFiles(meshes: readonly MeshFile[]): Promise<void> {
  for (const { upload, file } of meshes) {
    if (!hasMesh(upload)) provideMesh(upload, meshOfBytes(await readFile(file)));
  }
}
