import { joints } from './joints';
import type { TankDocument } from './document';
import { invalid, type DipwrightError } from '../errors';
import { lessWall } from './less-wall';
import { placedSolid, type PlacedSolid } from './placed-solid';

/**
 * The solids of a design as the liquid meets them: with inside sizes as they are drawn; with outside sizes those
 * that hold less the wall, and one more for what the wall leaves open at their joints. Those of which
 * nothing is left are not among them. Solids that displace are as drawn. Needs loadManifold() first.
 */
export function placedSolids({
  solids,
  wall,
}: Pick<TankDocument, 'solids' | 'wall'>): PlacedSolid[] {
  const placed = solids.map(placedSolid);
  return wall?.sizes === 'outside' ? insideWall(placed, wall.thickness) : placed;
}

/** The same for solids that are placed already, drawn with outside sizes. */
export function insideWall(placed: readonly PlacedSolid[], wallMm: number): PlacedSolid[] {
  const drawn = placed.filter(({ solid }) => solid.role === 'holds');
  const left = drawn.flatMap((one) => lessWall(one, wallMm) ?? []);
  const joined = joints(drawn, left, wallMm);
  if (drawn.length > 0 && left.length === 0 && !joined) throw nothingInsideWall();
  return [
    ...left,
    ...(joined ? [joined] : []),
    ...placed.filter(({ solid }) => solid.role === 'displaces'),
  ];
}

/** What is said of outside sizes that are all wall. */
export function nothingInsideWall(): DipwrightError {
  return invalid(
    '/wall/thickness',
    'Wall, thickness: the wall leaves no space inside. Make it thinner than half the least size of what holds.',
  );
}
