import { startingPoints } from '~/domain/tank/starting-points';
import type { TankDocument } from '~/domain/tank/document';

/** Sizes of the front page's tank, mm, inside. */
export interface HullSizes {
  widthMm: number;
  depthMm: number;
  lengthMm: number;
}

export const firstHull: HullSizes = { widthMm: 600, depthMm: 500, lengthMm: 1200 };

/** The V hull of the starting points, at other sizes: two wedges back to back, keel down, stick over the keel. */
export function vHull({ widthMm, depthMm, lengthMm }: HullSizes): TankDocument {
  const base = startingPoints.find(({ code }) => code === 'v-hull')!.design;
  const half = widthMm / 2;
  return {
    ...base,
    solids: base.solids.map((solid, index) =>
      solid.kind === 'wedge'
        ? { ...solid, length: half, width: lengthMm, height: depthMm, at: [index * half, 0, 0] }
        : solid,
    ),
    stick: { at: [half, lengthMm / 2] },
  };
}
