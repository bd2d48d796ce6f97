import { unionOf, without, type Interval } from '../../../../geometry/intervals';
import { lineInHalfSpaces, lineInQuadric, type Line } from '../../../../geometry/line';
import { lineInHead } from '../../../../geometry/line-in-head';
import { axisOrder } from '../../../../geometry/shape';
import { samePlaceMm } from '../../../../geometry/tolerance';
import type { Barrel, BarrelEnd } from './barrel';

/**
 * Stretches of a line of the own frame inside a barrel with its ends, ascending, mm: those inside the straight part
 * or an end that stands out of it, but not inside an end turned inward, whose surface counts the other way round.
 */
export function lineInCylinder(line: Line, barrel: Barrel, slack: number): Interval[] {
  const [first, second, third] = axisOrder(barrel.axis);
  const upright: Line = {
    origin: [line.origin[first]!, line.origin[second]!, line.origin[third]!],
    direction: [line.direction[first]!, line.direction[second]!, line.direction[third]!],
  };
  const held: Interval[] = [];
  const taken: Interval[] = [];
  const straight = inStraightPart(upright, barrel, slack);
  if (straight) held.push(straight);
  for (const end of barrel.ends) {
    const stretch = lineInHead(overMouth(upright, end), end.head, end.inward ? -slack : slack);
    if (stretch) (end.inward ? taken : held).push(stretch);
  }
  return without(unionOf(held, samePlaceMm), unionOf(taken), samePlaceMm);
}

function inStraightPart(line: Line, { radius, ends }: Barrel, slack: number): Interval | null {
  const stretches = ends.map(({ head, mouth }, i) => {
    const out = i === 0 ? -1 : 1;
    // where an end stands over the mouth, the mouth is a seam and no surface
    const within = head.form === 'flat' ? slack : samePlaceMm;
    return lineInHalfSpaces(line, [{ normal: [0, 0, out], offset: out * mouth }], within);
  });
  const round = lineInQuadric(line, [radius, radius, Infinity], slack);
  const [below, above] = stretches;
  if (!round || !below || !above) return null;
  const from = Math.max(round.from, below.from, above.from);
  const to = Math.min(round.to, below.to, above.to);
  return to >= from ? { from, to } : null;
}

/** The line in the end's own frame: its mouth at place 0, deep upwards. */
function overMouth({ origin, direction }: Line, { mouth, towards }: BarrelEnd): Line {
  return {
    origin: [origin[0], origin[1], towards * (origin[2] - mouth)],
    direction: [direction[0], direction[1], towards * direction[2]],
  };
}
