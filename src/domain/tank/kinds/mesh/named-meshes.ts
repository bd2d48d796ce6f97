import { invalid, type DipwrightError } from '../../../errors';
import type { TankDocument } from '../../document';

/** A solid of a design that needs a mesh. */
export interface NamedMesh {
  upload: string;
  solidId: string;
  /** JSON Pointer of the field that names it. */
  pointer: string;
}

/** The meshes that a design names, each once, in the order of its solids. */
export function namedMeshes({ solids }: Pick<TankDocument, 'solids'>): NamedMesh[] {
  const named = new Map<string, NamedMesh>();
  solids.forEach((solid, index) => {
    if (solid.kind !== 'mesh' || named.has(solid.upload)) return;
    const { upload, id } = solid;
    named.set(upload, { upload, solidId: id, pointer: `/solids/${index}/upload` });
  });
  return [...named.values()];
}

/** What is said of a design whose meshes have more triangles together than one may name. */
export function tooManyTriangles(pointer: string): DipwrightError {
  return invalid(
    pointer,
    'The meshes of this design have more than 2 000 000 triangles together: use coarser ones.',
  );
}
