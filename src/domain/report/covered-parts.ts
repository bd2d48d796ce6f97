/** A part of a stretch, as shares 0…1 of it. */
export type Part = readonly [from: number, to: number];

/** Where all of some linear functions, given by their values at 0 and 1, are at least 0 on 0…1; null where nowhere. */
export function partWhere(values: readonly (readonly [number, number])[]): Part | null {
  let [from, to] = [0, 1];
  for (const [start, end] of values) {
    if (start < 0 && end < 0) return null;
    if (start >= 0 && end >= 0) continue;
    const zero = start / (start - end);
    if (start < 0) from = Math.max(from, zero);
    else to = Math.min(to, zero);
    if (from >= to) return null;
  }
  return [from, to];
}

/** Parts in order, those that overlap or lie nearer than `gap` joined, and of these the ones longer than `gap`. */
export function joinedParts(parts: readonly Part[], gap: number): Part[] {
  const joined: [number, number][] = [];
  for (const [from, to] of [...parts].sort((a, b) => a[0] - b[0])) {
    const last = joined.at(-1);
    if (last && from - last[1] <= gap) last[1] = Math.max(last[1], to);
    else joined.push([from, to]);
  }
  return joined
    .filter(([from, to]) => to - from > gap)
    .map(([from, to]) => [from <= gap ? 0 : from, to >= 1 - gap ? 1 : to]);
}

/** What is left of 0…1 beside parts in order. */
export function partsBetween(parts: readonly Part[]): Part[] {
  const left: Part[] = [];
  let from = 0;
  for (const part of parts) {
    if (part[0] > from) left.push([from, part[0]]);
    from = part[1];
  }
  if (from < 1) left.push([from, 1]);
  return left;
}
