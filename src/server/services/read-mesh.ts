import { requirePermission } from '~/domain/access/permissions';
import { notFound } from '~/domain/errors';
import type { Actor, Context } from '../context';
import { findMeshes } from '../database/repositories/meshes';
import { meshKey } from './mesh-files';
import { scopeOf } from './scope-of';

/** A mesh of the workshop as it is kept, as a file of this machine. */
export async function readMesh(
  context: Context,
  actor: Actor,
  input: { meshId: string },
): Promise<{ file: string; bytes: number }> {
  requirePermission(actor.role, 'mesh.read');
  const [mesh] = await findMeshes(scopeOf(context, actor), [input.meshId]);
  if (mesh === undefined) throw notFound('mesh');
  const file = await context.storage.fileOf(meshKey(mesh.hash));
  if (file === null) throw new Error(`The storage has lost the mesh ${mesh.hash}.`);
  return { file, bytes: mesh.bytes };
}
