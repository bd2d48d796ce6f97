/** Sizes as a phrase: "900 × 500 × 300", mm, at most three decimals. */
export function sizeWords(...sizesMm: readonly number[]): string {
  return sizesMm.map((size) => String(Math.round(size * 1000) / 1000)).join(' × ');
}
