import { DipwrightError } from '~/domain/errors';
import type { TankDocument } from '~/domain/tank/document';
import { mostNamedTriangles } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { namedMeshes, tooManyTriangles } from '~/domain/tank/kinds/mesh/named-meshes';
import type { Context } from '../context';
import { findMeshes } from '../database/repositories/meshes';
import type { Scope } from '../database/scope';
import type { MeshFile } from '../jobs/mesh-work';

/**
 * The files of the meshes that a design names, of this workshop only. Throws `invalid`, one fault a solid, for one
 * that the workshop does not have.
 */
export async function meshFilesOf(
  { storage }: Pick<Context, 'storage'>,
  scope: Scope,
  design: TankDocument,
): Promise<MeshFile[]> {
  const named = namedMeshes(design);
  if (named.length === 0) return [];
  const records = await findMeshes(
    scope,
    named.map(({ upload }) => upload),
  );
  const byId = new Map(records.map((record) => [record.id, record]));
  const missing = named.filter(({ upload }) => !byId.has(upload));
  if (missing.length > 0) {
    throw refused(missing, 'there is no such mesh in your workshop: upload its file again.');
  }
  const triangles = records.reduce((sum, record) => sum + record.triangles, 0);
  if (triangles > mostNamedTriangles) throw tooManyTriangles(named[0]!.pointer);
  return Promise.all(
    named.map(async ({ upload }) => {
      const { hash } = byId.get(upload)!;
      const file = await storage.fileOf(meshKey(hash));
      if (file === null) throw new Error(`The storage has lost the mesh ${hash}.`);
      return { upload, file };
    }),
  );
}

/** For whoever may not use the meshes of a workshop: a design without any, or `invalid`. */
export function refuseMeshes(design: TankDocument): void {
  const named = namedMeshes(design);
  if (named.length === 0) return;
  throw refused(
    named,
    'a mesh is computed only for members who work on designs in the workshop that uploaded it: sign in first.',
  );
}

function refused(named: readonly { solidId: string; pointer: string }[], sentence: string) {
  const faults = named.map(({ solidId, pointer }) => ({
    pointer,
    detail: `Solid "${solidId}", upload: ${sentence}`,
  }));
  return new DipwrightError('invalid', faults[0]!.detail, { faults });
}

/** Where the storage keeps a mesh. */
export function meshKey(hash: string): string {
  return `meshes/${hash.slice(0, 2)}/${hash}`;
}
