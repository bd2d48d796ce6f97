import { meshOfBytes } from '../../../../geometry/mesh-import/mesh-bytes';
import type { TankMesh } from '../../../table/preview';

/** A kept mesh from its bytes as the server gives them, in the file's own numbers. Throws when they are not one. */
export function meshFromBytes(bytes: Uint8Array): TankMesh {
  return meshOfBytes(bytes);
}
