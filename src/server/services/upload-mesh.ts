import { requirePermission } from '~/domain/access/permissions';
import { invalid } from '~/domain/errors';
import { meshUnits, type MeshUpload, type UploadedMesh } from '~/domain/tank/kinds/mesh/uploaded';
import { greatestLengthMm } from '~/domain/tank/solid';
import { meshCaps } from '~/geometry/mesh-import/mesh-caps';
import { thinMm } from '~/geometry/tolerance';
import type { Actor, Context } from '../context';
import { keepMesh } from '../database/repositories/meshes';
import { meshKey } from './mesh-files';
import { scopeOf } from './scope-of';

/**
 * Takes an STL or OBJ file in: read and checked in the compute pool, kept once under the hash of what it holds, noted
 * for the workshop. `invalid`, one fault a sentence, for what is no closed mesh.
 */
export async function uploadMesh(
  context: Context,
  actor: Actor,
  input: MeshUpload & { sent: AsyncIterable<Uint8Array> },
): Promise<UploadedMesh> {
  requirePermission(actor.role, 'mesh.upload');
  const { unit, name, sent } = input;
  const scale = meshUnits[unit];
  const { bytes, hash, triangles, size, volume, notes } = await context.storage.withIncoming(
    sent,
    meshCaps.bytes,
    (file) => context.computePool.mesh(file),
  );
  const extentMm = size.map((length) => length * scale) as [number, number, number];
  if (Math.max(...extentMm) > greatestLengthMm || Math.min(...extentMm) < thinMm) {
    const words = extentMm.map((mm) => Number(mm.toPrecision(6))).join(' × ');
    throw invalid(
      '/unit',
      `In ${unit} the mesh would be ${words} mm, and sizes are from ${thinMm} to 100 000 mm: choose the unit that the file was drawn in.`,
    );
  }
  await context.storage.put(meshKey(hash), bytes);
  const id = meshId(hash);
  await keepMesh(scopeOf(context, actor), {
    id,
    hash,
    name,
    triangles,
    bytes: bytes.length,
    unit,
    createdBy: actor.userId,
    createdAt: context.clock.now(),
  });
  return {
    id,
    name,
    triangles,
    scale,
    extentMm,
    volumeL: (volume * scale ** 3) / 1e6,
    notes: [...notes],
  };
}

/** The first 122 bits of the hash as a UUID of version 8 (RFC 9562, section 5.8: made to one's own rule). */
function meshId(hash: string): string {
  const variant = '89ab'[parseInt(hash[16]!, 16) & 3]!;
  return [
    hash.slice(0, 8),
    hash.slice(8, 12),
    `8${hash.slice(13, 16)}`,
    `${variant}${hash.slice(17, 20)}`,
    hash.slice(20, 32),
  ].join('-');
}
