import { headDepth, type Head } from '../../../../geometry/head';
import type { Axis } from '../../../../geometry/shape';
import type { Cylinder, End } from './schema';

/** One end of a barrel where it stands. */
export interface BarrelEnd {
  head: Head;
  /** Place of the barrel's mouth along the axis, own frame, mm. */
  mouth: number;
  /** Direction along the axis in which the end is deep: away from the barrel, or into it when turned inward. */
  towards: 1 | -1;
  inward: boolean;
}

/** A cylinder in its own frame: its upright box, ends included, is centred on the origin. mm */
export interface Barrel {
  axis: Axis;
  radius: number;
  /** Extent along the axis: the straight part and what stands out of it. */
  overall: number;
  /** The end at the low end of the axis, the one at the high end. */
  ends: readonly [BarrelEnd, BarrelEnd];
}

export const flatEnds: readonly [End, End] = [{ form: 'flat' }, { form: 'flat' }];

export function barrelOf(solid: Cylinder): Barrel {
  const radius = solid.diameter / 2;
  const [low, high] = solid.ends ?? flatEnds;
  const [lowOut, highOut] = [standsOut(low, radius), standsOut(high, radius)];
  const overall = lowOut + solid.length + highOut;
  return {
    axis: solid.axis ?? 'x',
    radius,
    overall,
    ends: [
      {
        head: headOf(low, radius),
        mouth: lowOut - overall / 2,
        towards: low.inward ? 1 : -1,
        inward: low.inward ?? false,
      },
      {
        head: headOf(high, radius),
        mouth: overall / 2 - highOut,
        towards: high.inward ? -1 : 1,
        inward: high.inward ?? false,
      },
    ],
  };
}

function standsOut(end: End, radius: number): number {
  return end.inward ? 0 : headDepth(headOf(end, radius));
}

export function headOf(end: End, radius: number): Head {
  return { ...end, radius };
}
