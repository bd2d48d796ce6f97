import { dishSphere, headDepth, knuckleAngle, type Head } from './head';
import { headVolume } from './head-volume';
import type { Vec2 } from './shape';

/**
 * An arc of a meridian: its centre off the axis, the place of its highest point (told from there, not from the centre,
 * a nearly flat one loses no digits), radius, the angles off the axis it runs between. mm, radians
 */
interface Arc {
  off: number;
  top: number;
  radius: number;
  from: number;
  to: number;
}

/** A vertex before it is moved out: its foot on the arc, the direction out, how far it moves. mm */
interface Foot {
  on: Vec2;
  out: Vec2;
  offset: number;
}

/**
 * Half outline of an end, (radius, place over the barrel's mouth), from its tip on the axis to the barrel's rim, mm;
 * turned, its chords enclose exactly the end's volume. `facets` chords to a full turn of the barrel, a multiple of
 * 16; twice as many give twice as many chords here.
 *
 * Tip and rim stay where they are, and nothing stands out beyond them. Vertices between are moved out along the
 * normal. A chord of length l whose ends stand e and f off an arc of radius ρ encloses as much as the arc when
 * (e + f)/2 = l²/12ρ; so chords of one arc are alike and their vertices stand l²/12ρ off, a chord to a vertex that is
 * held back is shorter, and volume is right chord by chord: the part filled errs only as facets⁻³. What remains of
 * the whole, of higher order, is solved away.
 */
export function headProfile(head: Head, facets: number): Vec2[] {
  const depth = headDepth(head);
  const tip: Vec2 = [0, depth];
  const rim: Vec2 = [head.radius, 0];
  if (head.form === 'flat' || head.form === 'cone') return [tip, rim];
  // a half spheroid is a hemisphere stretched along the axis, which keeps shares of volume
  const stretch = head.form === 'ellipsoid' ? depth / head.radius : 1;
  const arcs = arcsOf(head);
  const feet = feetOf(arcs, chordCounts(arcs, head, facets));
  const target = headVolume(head) / stretch;
  const outline = (scale: number): Vec2[] => [
    [0, depth / stretch],
    ...feet.map(({ on, out, offset }): Vec2 => [
      on[0] + scale * offset * out[0],
      on[1] + scale * offset * out[1],
    ]),
    rim,
  ];
  const scale = rootNear(1, (value) => turnedVolume(outline(value)) / target - 1);
  const middle = outline(scale).slice(1, -1);
  return [tip, ...middle.map(([r, z]): Vec2 => [r, z * stretch]), rim];
}

function arcsOf(head: Exclude<Head, { form: 'flat' | 'cone' }>): Arc[] {
  const { radius } = head;
  if (head.form === 'ellipsoid') return [{ off: 0, top: radius, radius, from: 0, to: Math.PI / 2 }];
  if (head.form === 'dish') {
    const sphere = dishSphere(head);
    const to = Math.atan2(radius, sphere - head.depth);
    return [{ off: 0, top: head.depth, radius: sphere, from: 0, to }];
  }
  const { crown, knuckle } = head;
  const joint = knuckleAngle(head);
  const both: Arc[] = [
    { off: 0, top: headDepth(head), radius: crown, from: 0, to: joint },
    { off: radius - knuckle, top: knuckle, radius: knuckle, from: joint, to: Math.PI / 2 },
  ];
  // a crown of the barrel's own radius leaves no room for a knuckle
  return both.filter((arc) => arc.radius * (arc.to - arc.from) > shortestArcMm);
}

/** Shorter arcs than this are rounding. mm */
const shortestArcMm = 1e-5;

/**
 * Chords of each arc: the error of a part filled goes as r·l³/ρ, and is alike everywhere when the chords to a full
 * turn go as (ρ / barrel's radius)^⅔. Counted for 16 facets, so that counts double exactly when facets do.
 */
function chordCounts(arcs: readonly Arc[], head: Head, facets: number): number[] {
  // a needle would ask for millions
  const stretch = head.form === 'ellipsoid' ? Math.min(Math.cbrt(head.depth / head.radius), 2) : 1;
  return arcs.map(({ radius, from, to }) => {
    const turn = (to - from) / (2 * Math.PI);
    const ofSixteen = Math.ceil(16 * turn * Math.cbrt(radius / head.radius) ** 2 * stretch - 1e-9);
    return (Math.max(ofSixteen, 1) * facets) / 16;
  });
}

/** Share of an arc's usual chord that a chord to a vertex on the arc has; to a tip, where r grows from 0. */
const toRim = Math.sqrt(1 / 2);
const toTip = Math.sqrt(2 / 3);

/** The vertices between tip and rim. */
function feetOf(arcs: readonly Arc[], counts: readonly number[]): Foot[] {
  const last = arcs.length - 1;
  // shares that the first and the last chord of each arc have of its usual one
  const begins = arcs.map((_, i) => (i === 0 ? toTip : 1));
  const ends = arcs.map((_, i) => (i === last ? toRim : 1));
  const offsets = arcs.map(() => 0);
  // a vertex that two arcs share stands off as far as the lesser of them, which shortens a chord of the other, which
  // lengthens the rest: found by repeating
  for (let round = 0; round < 40; round += 1) {
    arcs.forEach(({ radius, from, to }, i) => {
      const step = (to - from) / (counts[i]! - 2 + begins[i]! + ends[i]!);
      offsets[i] = radius * (Math.sqrt(step / Math.sin(step)) - 1);
    });
    for (let i = 0; i < last; i += 1) {
      const shared = Math.min(offsets[i]!, offsets[i + 1]!);
      ends[i] = Math.sqrt((1 + shared / offsets[i]!) / 2);
      begins[i + 1] = Math.sqrt((1 + shared / offsets[i + 1]!) / 2);
    }
  }
  return arcs.flatMap(({ off, top, radius, from, to }, i) => {
    const step = (to - from) / (counts[i]! - 2 + begins[i]! + ends[i]!);
    const count = i === last ? counts[i]! - 1 : counts[i]!;
    return Array.from({ length: count }, (_, j): Foot => {
      const atJoint = j === counts[i]! - 1;
      const angle = atJoint ? to : from + (begins[i]! + j) * step;
      const out: Vec2 = [Math.sin(angle), Math.cos(angle)];
      const offset = atJoint ? Math.min(offsets[i]!, offsets[i + 1]!) : offsets[i]!;
      const on: Vec2 = [off + radius * out[0], top - 2 * radius * Math.sin(angle / 2) ** 2];
      return { on, out, offset };
    });
  });
}

/** Volume inside an outline from the axis to place 0 when it is turned, mm³. */
function turnedVolume(outline: readonly Vec2[]): number {
  let sum = 0;
  for (let i = 1; i < outline.length; i += 1) {
    const [r0, z0] = outline[i - 1]!;
    const [r1, z1] = outline[i]!;
    sum += (Math.PI / 3) * (r0 * r0 + r0 * r1 + r1 * r1) * (z0 - z1);
  }
  return sum;
}

/** Secant method from `start`. */
function rootNear(start: number, f: (value: number) => number): number {
  let [a, b] = [start * 0.99, start];
  let [fa, fb] = [f(a), f(b)];
  for (let round = 0; round < 20 && fb !== 0 && fb !== fa; round += 1) {
    const next = b - (fb * (b - a)) / (fb - fa);
    [a, fa, b, fb] = [b, fb, next, f(next)];
    if (Math.abs(b - a) < 1e-13 * Math.abs(b)) break;
  }
  return b;
}
