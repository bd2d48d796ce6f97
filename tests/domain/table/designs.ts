import type { TankDocument } from '~/domain/tank/document';
import type { Solid } from '~/domain/tank/kinds/registry';

/** A design of some solids, level and without a stick unless told. */
export function design(solids: readonly Solid[], rest: Partial<TankDocument> = {}): TankDocument {
  return { format: 'dipwright-tank', version: 1, name: 'test tank', solids: [...solids], ...rest };
}

/** A box that holds; its lowest corner at the origin unless told. */
export function box(
  id: string,
  [length, width, height]: readonly [number, number, number],
  rest: Partial<Solid> = {},
): Solid {
  return { id, role: 'holds', kind: 'box', length, width, height, ...rest } as Solid;
}

/** A cylinder that holds, lying along x unless told. */
export function cylinder(
  id: string,
  diameter: number,
  length: number,
  rest: Partial<Solid> = {},
): Solid {
  return { id, role: 'holds', kind: 'cylinder', diameter, length, ...rest } as Solid;
}

/** A wedge that holds unless told: full height at x = 0. */
export function wedge(
  id: string,
  [length, width, height]: readonly [number, number, number],
  rest: Partial<Solid> = {},
): Solid {
  return { id, role: 'holds', kind: 'wedge', length, width, height, ...rest } as Solid;
}

/** Inside 900 × 500 × 300, sump floor for 100 mm, then rising 60 mm over 800 mm. */
export const slopedCistern = design(
  [
    box('body', [900, 500, 300]),
    wedge('ramp', [800, 500, 60], { role: 'displaces', at: [100, 0, 0], turn: [0, 0, 180] }),
  ],
  { stick: { at: [50, 250] } },
);

/** V hull 600 wide at the top, 500 deep, 1200 long: two wedges upside down, back to back over the apex. */
export const hull = design(
  [
    wedge('port', [300, 1200, 500], { at: [450, -150, 0], turn: [180, 0, 90] }),
    wedge('starboard', [300, 1200, 500], { at: [450, -450, 0], turn: [180, 0, -90] }),
  ],
  { stick: { at: [600, 300] } },
);
