import type { TankDocument } from '~/domain/tank/document';
import { changeSolid } from './commands';

/** Radius of the four edges of a box along an axis, mm; 0 leaves them sharp and is not written. */
export function setEdgeRadius(
  document: TankDocument,
  id: string,
  axis: 'x' | 'y' | 'z',
  radiusMm: number,
): TankDocument {
  return changeSolid(document, id, (solid) => {
    if (solid.kind !== 'box') return solid;
    const { edges, ...rest } = solid;
    const { [axis]: _old, ...others } = edges ?? {};
    const left = radiusMm > 0 ? { ...others, [axis]: radiusMm } : others;
    return Object.keys(left).length === 0 ? rest : { ...rest, edges: left };
  });
}
