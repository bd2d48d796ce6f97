/** The place halfway along the side from a point of an outline to the next, in the outline's own two coordinates. */
export function midwayOn(
  outline: readonly (readonly [number, number, ...unknown[]])[],
  index: number,
): [number, number] {
  const from = outline[index]!;
  const to = outline[(index + 1) % outline.length]!;
  return [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
}
