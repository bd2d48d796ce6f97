import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import type { End } from '~/domain/tank/kinds/cylinder/schema';
import { cylinder, design } from '../table/designs';

const radius = 500;
const length = 1100;

/** Half outline of an end by a parameter 0…1 from the axis to the rim: [r, place over the mouth, −d place]. */
type Outline = (t: number) => readonly [number, number, number];
const quarter = Math.PI / 2;

const ends: readonly (readonly [string, End, readonly Outline[]])[] = [
  ['coned', { form: 'cone', depth: 250 }, [(t) => [radius * t, 250 * (1 - t), 250]]],
  ['dished', { form: 'dish', depth: 100 }, [arc(0, -1200, 1300, Math.asin(500 / 1300))]],
  ['hemispherical', { form: 'dish', depth: 500 }, [arc(0, 0, 500, quarter)]],
  [
    '2:1 elliptical',
    { form: 'ellipsoid', depth: 250 },
    [
      (t) => [
        radius * Math.sin(t * quarter),
        250 * Math.cos(t * quarter),
        250 * quarter * Math.sin(t * quarter),
      ],
    ],
  ],
  [
    'torispherical',
    { form: 'torisphere', crown: 1000, knuckle: 100 },
    // crown − knuckle is the hypotenuse between the centres, radius − knuckle its leg across
    [
      arc(0, -Math.sqrt(900 ** 2 - 400 ** 2), 1000, Math.asin(400 / 900)),
      arc(400, 0, 100, quarter, Math.asin(400 / 900)),
    ],
  ],
];

function arc(off: number, place: number, size: number, to: number, from = 0): Outline {
  return (t) => {
    const angle = from + t * (to - from);
    return [
      off + size * Math.sin(angle),
      place + size * Math.cos(angle),
      size * Math.sin(angle) * (to - from),
    ];
  };
}

/** Area of a disc below a chord y above its centre. */
function segment(r: number, y: number): number {
  if (y <= -r) return 0;
  if (y >= r) return Math.PI * r * r;
  return r * r * (quarter + Math.asin(y / r)) + y * Math.sqrt(r * r - y * y);
}

// Gauss and Legendre's points and weights of the eighth order, Abramowitz and Stegun, table 25.4
const gauss = [
  [0.1834346424956498, 0.362683783378362],
  [0.525532409916329, 0.3137066458778873],
  [0.7966664774136267, 0.2223810344533745],
  [0.9602898564975363, 0.1012285362903763],
].flatMap(([x, w]) => [
  [x!, w!],
  [-x!, w!],
]);

function integral(f: (t: number) => number): number {
  const panels = 300;
  let sum = 0;
  for (let i = 0; i < panels; i += 1) {
    for (const [x, w] of gauss) sum += (w! / 2 / panels) * f((i + (x! + 1) / 2) / panels);
  }
  return sum;
}

/**
 * Litres below a level by slices across the axis: every slice is a disc cut by a straight line. An independent way
 * that shares nothing with the engine. The barrel's middle is the origin; up has the parts `along` the axis (x) and
 * `across` it.
 */
function litresBySlices(
  outlines: readonly Outline[],
  sign: number,
  level: number,
  along: number,
  across: number,
): number {
  const slice = (r: number, x: number) => segment(r, (level - along * x) / across);
  let sum = integral((t) => length * slice(radius, (t - 0.5) * length));
  for (const side of [1, -1]) {
    for (const outline of outlines) {
      sum +=
        sign *
        integral((t) => {
          const [r, place, rate] = outline(t);
          return rate * slice(r, side * (length / 2 + sign * place));
        });
    }
  }
  return sum / 1e6;
}

/** Least level of the rims and of ends that stand out, mm: of points so close that what lies between is nothing. */
function lowestLevel(outlines: readonly Outline[], along: number, across: number): number {
  const steps = 100_000;
  let lowest = -Math.abs((along * length) / 2) - across * radius;
  for (const outline of outlines) {
    for (let i = 0; i <= steps; i += 1) {
      const [r, place] = outline(i / steps);
      lowest = Math.min(lowest, -Math.abs(along) * (length / 2 + place) - across * r);
    }
  }
  return lowest;
}

describe.each(ends)('%s ends, lying at a slope', (_, end, outlines) => {
  it.each([
    [0, false],
    [3, false],
    [25, false],
    [0, true],
    [10, true],
  ])(
    '%s°, turned inward: %s: litres as by slices, within 1e-7 of capacity (1.5e-7 of the less that inward ends leave)',
    async (pitch, inward) => {
      const one: End = inward ? { ...end, inward } : end;
      const tank = design([cylinder('c', 2 * radius, length, { ends: [one, one] })], {
        attitude: { pitch, roll: 0 },
      });
      const whole = await computeTable(tank, { atMm: [0] });
      const up = [-Math.sin((pitch * Math.PI) / 180), Math.cos((pitch * Math.PI) / 180)] as const;
      const zero = lowestLevel(inward ? [] : outlines, ...up);
      const atMm = [0.06, 0.2, 0.37, 0.5, 0.71, 0.93].map((share) => share * whole.heightMm);
      const { rows, capacityL, errorL } = await computeTable(tank, { atMm });
      rows.forEach(({ volumeL }, i) => {
        const exact = litresBySlices(outlines, inward ? -1 : 1, zero + atMm[i]!, ...up);
        expect(Math.abs(volumeL - exact) / capacityL).toBeLessThan(inward ? 1.5e-7 : 1e-7);
        expect(Math.abs(volumeL - exact)).toBeLessThan(errorL);
      });
    },
  );
});
