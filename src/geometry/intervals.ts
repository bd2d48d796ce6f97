/** A stretch of a line from t = `from` to t = `to`, mm. */
export interface Interval {
  from: number;
  to: number;
}

/** The union of stretches, ascending; those that meet within `touching` mm become one. */
export function unionOf(intervals: readonly Interval[], touching = 0): Interval[] {
  const sorted = [...intervals].sort((one, other) => one.from - other.from);
  const result: Interval[] = [];
  for (const { from, to } of sorted) {
    const last = result.at(-1);
    if (last && from <= last.to + touching) last.to = Math.max(last.to, to);
    else result.push({ from, to });
  }
  return result;
}

/** What remains of disjoint ascending stretches when others are taken away; bits up to `touching` mm are dropped. */
export function without(
  intervals: readonly Interval[],
  taken: readonly Interval[],
  touching = 0,
): Interval[] {
  let left = intervals.map((one) => ({ ...one }));
  for (const hole of taken) {
    left = left.flatMap(({ from, to }) =>
      hole.to <= from || hole.from >= to
        ? [{ from, to }]
        : [
            { from, to: Math.min(to, hole.from) },
            { from: Math.max(from, hole.to), to },
          ].filter((bit) => bit.to - bit.from > 0),
    );
  }
  return left.filter(({ from, to }) => to - from > touching);
}
