import { headDepth, type Head } from '../../../../geometry/head';
import { leastGap } from '../../../../geometry/head-gap';
import { thinMm } from '../../../../geometry/tolerance';
import { sizeWords } from '../size-words';
import { flatEnds, headOf } from './barrel';
import type { Cylinder, End } from './schema';

interface Fault {
  path: readonly string[];
  detail: string;
}

/** What ends contradict: the barrel's radius, their own sizes, each other. */
export function endFaults(solid: Cylinder): readonly Fault[] {
  const radius = solid.diameter / 2;
  const ends = solid.ends ?? flatEnds;
  const own = ends.flatMap((end, i) =>
    ofOne(end, radius).map(({ path, detail }) => ({ path: ['ends', String(i), ...path], detail })),
  );
  return own.length > 0 ? own : meeting(solid.length, radius, ends);
}

function ofOne(end: End, radius: number): Fault[] {
  const words = `the barrel's radius, ${sizeWords(radius)} mm`;
  if (end.form === 'flat') {
    const detail = 'a flat end has no depth to turn inward: leave "inward" out.';
    return end.inward ? [{ path: ['inward'], detail }] : [];
  }
  if (end.form === 'dish' && end.depth > radius) {
    const detail = `a dish is at most as deep as ${words}: beyond it, take "ellipsoid".`;
    return [{ path: ['depth'], detail }];
  }
  if (end.form !== 'torisphere') return [];
  const { crown, knuckle } = end;
  const faults: Fault[] = [];
  if (crown < radius) {
    faults.push({ path: ['crown'], detail: `the crown is at least ${words}.` });
  }
  if (knuckle >= radius) {
    faults.push({ path: ['knuckle'], detail: `the knuckle is less than ${words}.` });
  } else if (knuckle > crown) {
    const detail = `the knuckle is at most the crown, ${sizeWords(crown)} mm.`;
    faults.push({ path: ['knuckle'], detail });
  }
  return faults;
}

/** An end turned inward stands clear of the other one by 0.01 mm at least, wherever they come nearest. */
function meeting(length: number, radius: number, ends: readonly [End, End]): Fault[] {
  if (!ends.some(({ inward }) => inward)) return [];
  const [low, high] = ends.map((end) => headOf(end, radius)) as [Head, Head];
  const gap = leastGap(
    { head: low, inward: ends[0].inward ?? false },
    { head: high, inward: ends[1].inward ?? false },
    length,
  );
  if (gap.mm >= thinMm) return [];
  const words = `the length, ${sizeWords(length)} mm`;
  if (ends.every(({ inward }) => inward)) {
    const depths = `${sizeWords(headDepth(low))} and ${sizeWords(headDepth(high))} mm`;
    const detail = `turned inward, the ends meet: their depths, ${depths}, add up to less than ${words}.`;
    return [{ path: ['ends'], detail }];
  }
  const which = ends[0].inward ? 0 : 1;
  const other = ends[1 - which]!;
  const path = ['ends', String(which)];
  if (other.form === 'flat') {
    const depth = sizeWords(headDepth(which === 0 ? low : high));
    return [
      {
        path,
        detail: `turned inward, it reaches the other end: its depth, ${depth} mm, is less than ${words}.`,
      },
    ];
  }
  const needed = Math.ceil((length - gap.mm + thinMm) * 10) / 10;
  const place = gap.r < radius / 1000 ? 'on the axis' : `${Math.round(gap.r)} mm off the axis`;
  return [
    {
      path,
      detail: `turned inward, it reaches the other end ${place}: make it less deep, or the length ${needed} mm or more.`,
    },
  ];
}
