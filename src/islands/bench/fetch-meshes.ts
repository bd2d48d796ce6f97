import type { TankDocument } from '~/domain/tank/document';
import { hasMesh, provideMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { meshFromBytes } from '~/domain/tank/kinds/mesh/mesh-from-bytes';
import { namedMeshes } from '~/domain/tank/kinds/mesh/named-meshes';
import type { NamedMesh } from '~/workers/preview-protocol';
import { readMesh } from '../shared/api';
import { ApiProblem } from '../shared/problem';

/**
 * The meshes of a design that this page has not had yet, to be handed to the worker; from then on the page knows them
 * too. One that the server does not give is left out: the engine then says which solid lacks it.
 */
export async function fetchMeshes(design: TankDocument): Promise<NamedMesh[]> {
  const wanted = namedMeshes(design).filter(({ upload }) => !hasMesh(upload));
  const found = await Promise.all(
    wanted.map(async ({ upload }) => {
      try {
        return { upload, mesh: meshFromBytes(await readMesh(upload)) };
      } catch (error) {
        if (error instanceof ApiProblem) return null;
        throw error;
      }
    }),
  );
  const meshes = found.filter((one) => one !== null);
  for (const { upload, mesh } of meshes) provideMesh(upload, mesh);
  return meshes;
}
