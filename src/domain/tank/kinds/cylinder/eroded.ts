import { dishSphere, headDepth } from '../../../../geometry/head';
import { axisOrder } from '../../../../geometry/shape';
import type { Vec3 } from '../../solid';
import { barrelOf, flatEnds, headOf, type BarrelEnd } from './barrel';
import type { Cylinder, End } from './schema';

/**
 * A cylinder less its wall, see Kind.eroded: barrel and ends keep their middles and lose `wallMm` of their radii, and
 * meet where they then do. undefined where they are no cylinder with such ends any more: the inside of half a
 * spheroid is none, nor is what an end turned inward leaves.
 */
export function erodedCylinder(
  solid: Cylinder,
  wallMm: number,
): { solid: Cylinder; shift: Vec3 } | null | undefined {
  const diameter = solid.diameter - 2 * wallMm;
  if (!(diameter > 0)) return null;
  const barrel = barrelOf(solid);
  const drawn = solid.ends ?? flatEnds;
  const [low, high] = barrel.ends.map((end, i) => inside(drawn[i]!, end, wallMm));
  if (!low || !high) return undefined;
  const length = high.mouth - low.mouth;
  if (!(length > 0)) return low.end.form === 'flat' && high.end.form === 'flat' ? null : undefined;
  const depthOf = ({ end }: Inside) => headDepth(headOf(end, diameter / 2));
  const shift: [number, number, number] = [0, 0, 0];
  shift[axisOrder(barrel.axis)[2]] = (low.mouth - depthOf(low) + high.mouth + depthOf(high)) / 2;
  const ends = solid.ends && { ends: [low.end, high.end] as [End, End] };
  return { solid: { ...solid, diameter, length, ...ends }, shift };
}

interface Inside {
  end: End;
  /** Where the straight part ends, own frame of the drawn solid, mm. */
  mouth: number;
}

function inside(end: End, { head, mouth, towards }: BarrelEnd, wallMm: number): Inside | null {
  const { radius } = head;
  const left = radius - wallMm;
  if (end.form === 'flat') return { end, mouth: mouth - towards * wallMm };
  if (end.inward) return null;
  if (end.form === 'cone') {
    const slant = Math.hypot(radius, end.depth);
    return {
      end: { ...end, depth: (left * end.depth) / radius },
      mouth: mouth - (towards * wallMm * (slant - end.depth)) / radius,
    };
  }
  if (end.form === 'ellipsoid') {
    if (end.depth !== radius) return null;
    return { end: { ...end, depth: left }, mouth };
  }
  if (end.form === 'torisphere' && end.knuckle > wallMm) {
    return { end: { ...end, crown: end.crown - wallMm, knuckle: end.knuckle - wallMm }, mouth };
  }
  // a cap of a smaller sphere about the same middle; of a torisphere it is all that is left of its end
  const sphere = end.form === 'dish' ? dishSphere({ radius, depth: end.depth }) : end.crown;
  const top = headDepth(head) - wallMm;
  const across = sphere - wallMm;
  const depth = across - Math.sqrt(Math.max(across * across - left * left, 0));
  return { end: { form: 'dish', depth }, mouth: mouth + towards * (top - depth) };
}
