import type { Head } from './head';
import { headHeight } from './head-height';

/** An end, and whether it stands into its barrel. */
export interface TurnedHead {
  head: Head;
  inward: boolean;
}

const samples = 1024;

/**
 * Least distance along the axis between the ends of a barrel of a length, and how far off the axis it is, mm; 0 or
 * less when they meet. Both ends on one side of the barrel may come nearest anywhere: 1024 circles are looked at,
 * then the least is narrowed down.
 */
export function leastGap(
  low: TurnedHead,
  high: TurnedHead,
  length: number,
): { mm: number; r: number } {
  const { radius } = low.head;
  const at = (t: number) => radius * Math.sin(t * (Math.PI / 2));
  const gap = (t: number) => length + signed(low, at(t)) + signed(high, at(t));
  let least = 0;
  for (let i = 1; i <= samples; i += 1) if (gap(i / samples) < gap(least)) least = i / samples;
  let [from, to] = [Math.max(least - 1 / samples, 0), Math.min(least + 1 / samples, 1)];
  for (let round = 0; round < 60; round += 1) {
    const third = (to - from) / 3;
    if (gap(from + third) <= gap(to - third)) to -= third;
    else from += third;
  }
  const t = gap((from + to) / 2) < gap(least) ? (from + to) / 2 : least;
  return { mm: gap(t), r: at(t) };
}

function signed({ head, inward }: TurnedHead, r: number): number {
  return (inward ? -1 : 1) * headHeight(head, r);
}
