import type { MeshRecord } from '../models/mesh';
import type { Scope } from '../scope';

/** Those of the ids that the workshop has. */
export async function findMeshes(scope: Scope, ids: readonly string[]): Promise<MeshRecord[]> {
  if (ids.length === 0) return [];
  const found = await scope.database.models.meshes.findAll({
    where: { workshopId: scope.workshopId, id: [...ids] },
    transaction: scope.transaction,
  });
  return found.map((mesh) => mesh.get());
}

/** Notes a mesh; one that the workshop has already stays as it was first noted. */
export async function keepMesh(scope: Scope, mesh: Omit<MeshRecord, 'workshopId'>): Promise<void> {
  await scope.database.models.meshes.bulkCreate([{ ...mesh, workshopId: scope.workshopId }], {
    ignoreDuplicates: true,
    transaction: scope.transaction,
  });
}
