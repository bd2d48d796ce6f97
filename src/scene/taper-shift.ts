import type { TankDocument } from '~/domain/tank/document';
import { resizeSolid } from './commands';

/** Moves the centre of a taper's top against the centre of its bottom, along x (0) or y (1), mm. */
export function setTaperShift(
  document: TankDocument,
  id: string,
  axis: 0 | 1,
  valueMm: number,
): TankDocument {
  return resizeSolid(document, id, (solid) => {
    if (solid.kind !== 'taper') return solid;
    const shift: [number, number] = [...(solid.shift ?? [0, 0])];
    shift[axis] = valueMm;
    return { ...solid, shift };
  });
}
