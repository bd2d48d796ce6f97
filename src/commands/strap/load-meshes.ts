import { createReadStream } from 'node:fs';
import { stat } from 'node:fs/promises';
import { dirname, resolve } from 'node:path';
import { invalid } from '~/domain/errors';
import type { TankDocument } from '~/domain/tank/document';
import { mostNamedTriangles, provideMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { namedMeshes, tooManyTriangles } from '~/domain/tank/kinds/mesh/named-meshes';
import { importMesh } from '~/geometry/mesh-import/import-mesh';
import { MeshFileError } from '~/geometry/mesh-import/mesh-file-error';

/**
 * Reads the mesh files that a design names, by paths from the folder of the design file. Throws `invalid`, naming
 * the solid, for one that is missing or is no closed mesh.
 */
export async function loadMeshes(design: TankDocument, designFile: string): Promise<void> {
  let triangles = 0;
  for (const { upload, solidId, pointer } of namedMeshes(design)) {
    const file = resolve(dirname(designFile), upload);
    const refuse = (sentence: string) =>
      invalid(pointer, `Solid "${solidId}", upload: the file ${upload}: ${sentence}`);
    const found = await stat(file).catch(() => null);
    if (!found?.isFile()) {
      throw refuse('there is none beside the design file that can be read.');
    }
    try {
      const { mesh } = await importMesh(createReadStream(file), found.size);
      triangles += mesh.triangles.length / 3;
      if (triangles > mostNamedTriangles) throw tooManyTriangles(pointer);
      provideMesh(upload, mesh);
    } catch (error) {
      if (error instanceof MeshFileError) throw refuse(lowered(error.message));
      if ((error as NodeJS.ErrnoException).syscall) throw refuse('it cannot be read.');
      throw error;
    }
  }
}

function lowered(sentence: string): string {
  return sentence.charAt(0).toLowerCase() + sentence.slice(1);
}
