/** Real roots of a t² + b t + c, ascending, without loss by subtraction; none where all three are 0. */
export function quadraticRoots(a: number, b: number, c: number): number[] {
  if (a === 0) return b === 0 ? [] : [-c / b];
  const square = b * b - 4 * a * c;
  if (square < 0) return [];
  const q = -(b + (b < 0 ? -1 : 1) * Math.sqrt(square)) / 2;
  if (q === 0) return [0];
  return [q / a, c / q].sort((one, other) => one - other);
}
