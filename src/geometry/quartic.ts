import { columns } from './columns';

/**
 * A sum of polynomials of degree ≤ 4 in the level, each of which starts or ends at some row. Each is
 * given expanded about the row it starts at and carried on from row to row; global powers of the
 * level would lose all digits.
 */
export interface CarriedQuartic {
  /** Coefficients that join at each row, by degree. */
  joining: readonly [Float64Array, Float64Array, Float64Array, Float64Array, Float64Array];
  /** The running coefficients about the present row. */
  run: Float64Array;
}

export function carriedQuartic(rows: number): CarriedQuartic {
  return { joining: columns(5, rows), run: new Float64Array(5) };
}

/** Adds w·(c3·t³ + c4·t⁴) from a row on, t the distance of that row from the polynomial's own zero. */
export function join(
  into: CarriedQuartic,
  row: number,
  w: number,
  c3: number,
  c4: number,
  t: number,
): void {
  const [j0, j1, j2, j3, j4] = into.joining;
  const t2 = t * t;
  const t3 = t2 * t;
  j0[row]! += w * (c3 * t3 + c4 * t2 * t2);
  j1[row]! += w * (3 * c3 * t2 + 4 * c4 * t3);
  j2[row]! += w * (3 * c3 * t + 6 * c4 * t2);
  j3[row]! += w * (c3 + 4 * c4 * t);
  j4[row]! += w * c4;
}

/** Moves the running sum on to `row`, `step` above the last one. */
export function advance({ run, joining }: CarriedQuartic, row: number, step: number): void {
  const c1 = run[1]!;
  const c2 = run[2]!;
  const c3 = run[3]!;
  const c4 = run[4]!;
  run[0]! += step * (c1 + step * (c2 + step * (c3 + step * c4))) + joining[0][row]!;
  run[1] = c1 + step * (2 * c2 + step * (3 * c3 + 4 * step * c4)) + joining[1][row]!;
  run[2] = c2 + step * (3 * c3 + 6 * step * c4) + joining[2][row]!;
  run[3] = c3 + 4 * step * c4 + joining[3][row]!;
  run[4] = c4 + joining[4][row]!;
}
