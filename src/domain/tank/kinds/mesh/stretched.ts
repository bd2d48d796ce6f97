import type { Vec3 } from '../../solid';
import type { MeshSolid } from './schema';

/**
 * A mesh solid that the ± of its lengths was added to: its own factor along each axis beside the scale. Only made
 * inside the engine; no document has it.
 */
export interface StretchedMesh extends MeshSolid {
  stretch?: Vec3;
}

/** Millimetres to a unit of the file along own x, y, z. */
export function factorsOf(solid: MeshSolid): Vec3 {
  const scale = solid.scale ?? 1;
  const [x, y, z] = (solid as StretchedMesh).stretch ?? [1, 1, 1];
  return [scale * x, scale * y, scale * z];
}
