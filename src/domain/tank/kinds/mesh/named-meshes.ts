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
