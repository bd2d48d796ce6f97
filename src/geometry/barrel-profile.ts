import type { TurnedHead } from './head-gap';
import { headProfile } from './head-profile';
import type { Vec2 } from './shape';

/** A half outline's finest chords, as a multiple of the usual. */
const finest = 64;

/**
 * Closed half outline of a barrel with its ends, (radius, place along the axis), from the low tip to the high one,
 * mm; turned, it encloses exactly their volume. `low` and `high` are the places of the barrel's mouths. Two ends
 * deep in the same direction may stand so near each other that the usual chords would cross: then there are more.
 */
export function barrelProfile(
  low: TurnedHead & { mouth: number },
  high: TurnedHead & { mouth: number },
  facets: number,
): Vec2[] {
  for (let chords = facets; ; chords *= 2) {
    const below = headProfile(low.head, chords).map(([r, z]): Vec2 => [
      r,
      low.mouth + (low.inward ? z : -z),
    ]);
    const above = headProfile(high.head, chords).map(([r, z]): Vec2 => [
      r,
      high.mouth + (high.inward ? -z : z),
    ]);
    if (chords >= finest * facets || low.inward === high.inward || !cross(below, above)) {
      return [...below, ...above.reverse()];
    }
  }
}

/** Whether the lower of two outlines, both from the axis to the rim, is anywhere not below the upper. */
function cross(below: readonly Vec2[], above: readonly Vec2[]): boolean {
  return (
    below.some(([r, z]) => z >= placeAt(above, r)) || above.some(([r, z]) => z <= placeAt(below, r))
  );
}

function placeAt(outline: readonly Vec2[], r: number): number {
  const after = Math.max(
    outline.findIndex(([radius]) => radius >= r),
    1,
  );
  const [r0, z0] = outline[after - 1]!;
  const [r1, z1] = outline[after]!;
  return r1 === r0 ? z1 : z0 + ((r - r0) / (r1 - r0)) * (z1 - z0);
}
