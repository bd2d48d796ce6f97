import { unionOf, without, type Interval } from '../../geometry/intervals';
import type { Line } from '../../geometry/line';
import { samePlaceMm } from '../../geometry/tolerance';
import { chordsOf, type PlacedSolid } from '../tank/placed-solid';

/**
 * The stretches of a line inside the liquid space, ascending, closed form. Stretches that meet within
 * 2e-6 mm are one; a line along a wall counts as inside the solid that holds and outside one that displaces.
 */
export function columnOf(solids: readonly PlacedSolid[], line: Line): Interval[] {
  const stretches = (role: 'holds' | 'displaces', slack: number) =>
    solids
      .filter(({ solid }) => solid.role === role)
      .flatMap((one) => chordsOf(one, line, slack).map((stretch) => ({ ...stretch })));
  const held = unionOf(stretches('holds', samePlaceMm), samePlaceMm);
  return without(held, unionOf(stretches('displaces', -samePlaceMm)), samePlaceMm);
}
