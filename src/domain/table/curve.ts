import { DipwrightError } from '../errors';

/**
 * A table as a function: depth ↔ litres between its rows, by cubic Hermite on volume and free
 * surface (dV/dh is the surface). Error about 3e-8 of capacity between ordinary rows; larger where
 * a floor or roof is tangent to the surface, unless closer rows stand there (rows-between.ts): with them within
 * 1e-6 of capacity everywhere. Depths are readings along the stick, mm.
 *
 * A row's surface is that just above it, so a flat step in the floor (the top of a wheel arch) gives the
 * segment below it a wrong slope at its upper end. Such a slope betrays itself: it misses the chord by half
 * the difference of both slopes, where a smooth wall misses by a small part of it. The chord then tells.
 *
 * `slopeFactor` is dLevel/dReading: 1 unless the tank stands tilted, where a millimetre of stick is
 * less than a millimetre of plumb height (cos of the tilt).
 */
export interface Curve {
  depthMm: Float64Array;
  volumeL: Float64Array;
  /** dV/d(depthMm), litres per millimetre. */
  slopeLPerMm: Float64Array;
}

export function curveFromRows(
  rows: readonly { depthMm: number; volumeL: number; surfaceCm2: number }[],
  slopeFactor = 1,
): Curve {
  return {
    depthMm: Float64Array.from(rows, (row) => row.depthMm),
    volumeL: Float64Array.from(rows, (row) => row.volumeL),
    // 1 cm² × 1 mm = 100 mm³ = 1e-4 L
    slopeLPerMm: Float64Array.from(rows, (row) => row.surfaceCm2 * 1e-4 * slopeFactor),
  };
}

/** Litres at a reading. Throws `invalid` outside the table. */
export function volumeAt(curve: Curve, depthMm: number): number {
  const { depthMm: xs, volumeL: vs, slopeLPerMm: ms } = curve;
  const last = xs.length - 1;
  if (!(depthMm >= xs[0]! && depthMm <= xs[last]!)) throw outside(xs[0]!, xs[last]!);
  const i = segmentOf(xs, depthMm);
  return hermite(xs, vs, ms, i, depthMm);
}

/** The reading at which so many litres stand. Throws `invalid` outside the table. Monotone bisection to 1e-9 mm. */
export function depthAt(curve: Curve, volumeL: number): number {
  const { depthMm: xs, volumeL: vs, slopeLPerMm: ms } = curve;
  const last = xs.length - 1;
  if (!(volumeL >= vs[0]! && volumeL <= vs[last]!)) {
    throw new DipwrightError(
      'invalid',
      `The table holds from ${round(vs[0]!)} to ${round(vs[last]!)} L.`,
      {
        faults: [
          {
            pointer: '/volumeL',
            detail: `Give a volume from ${round(vs[0]!)} to ${round(vs[last]!)} L.`,
          },
        ],
      },
    );
  }
  const i = segmentOf(vs, volumeL);
  let low = xs[i]!;
  let high = xs[i + 1] ?? low;
  for (let step = 0; step < 80 && high - low > 1e-9; step += 1) {
    const middle = (low + high) / 2;
    if (hermite(xs, vs, ms, i, middle) < volumeL) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** Index of the segment [i, i + 1] that holds the value; rows ascend. */
export function segmentOf(ascending: Float64Array, value: number): number {
  let low = 0;
  let high = ascending.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (ascending[middle]! <= value) low = middle;
    else high = middle;
  }
  return low;
}

function hermite(
  xs: Float64Array,
  vs: Float64Array,
  ms: Float64Array,
  i: number,
  x: number,
): number {
  const x0 = xs[i]!;
  const x1 = xs[i + 1];
  if (x1 === undefined || x1 === x0) return vs[i]!;
  return litresBetween(x0, vs[i]!, ms[i]!, x1, vs[i + 1]!, ms[i + 1]!, x);
}

/**
 * Litres at a reading x between two rows: readings x0 < x1 in mm, their litres v and slopes m in litres per
 * millimetre. Never outside v0…v1.
 */
export function litresBetween(
  x0: number,
  v0: number,
  m0: number,
  x1: number,
  v1: number,
  m1: number,
  x: number,
): number {
  const h = x1 - x0;
  const t = (x - x0) / h;
  const t2 = t * t;
  const t3 = t2 * t;
  const high = upperSlope((v1 - v0) / h, m0, m1);
  const value =
    (2 * t3 - 3 * t2 + 1) * v0 +
    (t3 - 2 * t2 + t) * h * m0 +
    (3 * t2 - 2 * t3) * v1 +
    (t3 - t2) * h * high;
  // a kink inside a segment may make the cubic overshoot its ends by a hair
  return Math.min(Math.max(value, v0), v1);
}

function outside(low: number, high: number): DipwrightError {
  const detail = `Give a depth from ${round(low)} to ${round(high)} mm: the stick ends there.`;
  return new DipwrightError('invalid', detail, { faults: [{ pointer: '/depthMm', detail }] });
}

function round(value: number): string {
  return String(Math.round(value * 10) / 10);
}

/** The slope just below the upper row; the chord of a parabola is the mean of its end slopes. */
function upperSlope(chord: number, low: number, high: number): number {
  const miss = Math.abs(chord - (low + high) / 2);
  const fromChord = 2 * chord - low;
  const jumps = miss > 0.35 * Math.abs(high - low) && miss > 1e-3 * Math.max(low, high);
  return jumps && fromChord >= 0 ? fromChord : high;
}
