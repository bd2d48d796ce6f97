/** A tuple of so many columns. */
type Columns<N extends number, Made extends Float64Array[] = []> = Made['length'] extends N
  ? Made
  : Columns<N, [...Made, Float64Array]>;

/**
 * So many columns of zeros, each as long as the rows, side by side in one buffer: 23 of 400 rows made
 * one by one took 106 µs against 5 µs, two thirds of the whole sweep of a small tank.
 */
export function columns<const N extends number>(count: N, rows: number): Columns<N> {
  const all = new Float64Array(count * rows);
  return Array.from({ length: count }, (_, i) =>
    all.subarray(i * rows, (i + 1) * rows),
  ) as Columns<N>;
}
