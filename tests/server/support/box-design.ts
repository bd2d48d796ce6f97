import type { TankDocument } from '~/domain/tank/document';

/** An upright box, inside sizes in mm; litres at a depth are length × width × depth / 10⁶. */
export function boxDesign(length = 1000, width = 500, height = 300, name = 'Box'): TankDocument {
  return {
    format: 'dipwright-tank',
    version: 1,
    name,
    solids: [{ id: 'body', role: 'holds', kind: 'box', length, width, height }],
  };
}
