import { unionOf, without, type Interval } from '../../geometry/intervals';
import { samePlaceMm } from '../../geometry/tolerance';
import { chordsOf, type PlacedSolid } from '../tank/placed-solid';

/** How far beside a stick the columns are looked at that tell on which side of a wall it stands. mm */
const besideMm = 1e-5;

/**
 * The stretches of liquid space straight over and under (x, y), ascending z, mm, closed form. Stretches that
 * meet within 2e-6 mm are one. On a wall the column is that of the side where there is liquid space; between
 * two such sides, that beside what displaces rather than that over it.
 */
export function columnAt(solids: readonly PlacedSolid[], x: number, y: number): Interval[] {
  const beside = column(solids, x, y, -samePlaceMm);
  const over = column(solids, x, y, samePlaceMm);
  if (alike(beside, over)) return beside;
  const around = [1, -1].flatMap((dx) =>
    [1, -1].map((dy) => column(solids, x + dx * besideMm, y + dy * besideMm, 0)),
  );
  return around.some((one) => alike(one, beside)) ? beside : over;
}

/** `slack`: how far outside a solid that displaces its surface still counts as it; negative, inside. */
function column(solids: readonly PlacedSolid[], x: number, y: number, slack: number): Interval[] {
  const line = { origin: [x, y, 0], direction: [0, 0, 1] } as const;
  const stretches = (role: 'holds' | 'displaces', within: number) =>
    solids.filter(({ solid }) => solid.role === role).flatMap((one) => chordsOf(one, line, within));
  const held = unionOf(stretches('holds', samePlaceMm), samePlaceMm);
  return without(held, unionOf(stretches('displaces', slack)), samePlaceMm);
}

function alike(one: readonly Interval[], other: readonly Interval[]): boolean {
  return (
    one.length === other.length &&
    one.every(({ from, to }, i) => {
      const { from: from2, to: to2 } = other[i]!;
      return Math.abs(from - from2) < 100 * besideMm && Math.abs(to - to2) < 100 * besideMm;
    })
  );
}
