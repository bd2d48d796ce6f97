import fc from 'fast-check';
import { between } from './between';
import type { PlainSolid } from './membership';

/** Designs as plain JSON, for properties and for what the command makes of anything. mm, degrees. */
export interface PlainDesign {
  format: string;
  version: number;
  name: string;
  solids: PlainSolid[];
  attitude?: { pitch: number; roll: number };
  stick?: { at: [number, number]; zero?: number };
  outlet?: [number, number, number];
  vent?: [number, number, number];
  wall?: { thickness: number; sizes: string };
}

const size = between(80, 700);
const axis = fc.constantFrom('x', 'y', 'z');

const end = (diameter: number) => {
  const r = diameter / 2;
  const depth = between(0.1 * r, 0.8 * r);
  const inward = fc.constantFrom(undefined, undefined, true);
  const formed = (form: string) =>
    fc
      .record({ form: fc.constant(form), depth, inward })
      .map(({ inward: into, ...rest }) => (into ? { ...rest, inward: true } : rest));
  return fc.oneof(
    fc.constant({ form: 'flat' }),
    formed('cone'),
    formed('dish'),
    formed('ellipsoid'),
    fc.tuple(between(1, 2), between(0.06, 0.5)).map(([crown, knuckle]) => ({
      form: 'torisphere',
      crown: diameter * crown,
      knuckle: r * knuckle,
    })),
  );
};

const kinds: Record<string, fc.Arbitrary<Record<string, unknown>>> = {
  box: fc
    .tuple(size, size, size, fc.constantFrom('none', 'one', 'two', 'all'), between(0.05, 0.4), axis)
    .map(([length, width, height, rounded, share, along]) => {
      const r = share * Math.min(length, width, height);
      const others = 'xyz'.replace(along, '');
      const edges = {
        none: undefined,
        one: { [along]: r },
        two: { [others[0]!]: r / 2, [others[1]!]: r / 2, [along]: r },
        all: { x: r, y: r, z: r },
      }[rounded];
      return { length, width, height, ...(edges ? { edges } : {}) };
    }),
  cylinder: fc
    .tuple(size, between(300, 900), axis)
    .chain(([diameter, length, along]) =>
      fc
        .tuple(end(diameter), end(diameter))
        .map((ends) => ({ diameter, length: length + diameter, axis: along, ends })),
    ),
  oval: fc
    .tuple(size, size, size, fc.constantFrom('x', 'y'))
    .map(([length, width, height, along]) => ({ length, width, height, axis: along })),
  sphere: size.map((diameter) => ({ diameter })),
  ellipsoid: fc
    .tuple(size, size, size)
    .map(([length, width, height]) => ({ length, width, height })),
  cone: fc
    .tuple(fc.oneof(fc.constant(0), size), size, size, axis)
    .map(([start, last, length, along]) => ({ start, end: last, length, axis: along })),
  wedge: fc.tuple(size, size, size).map(([length, width, height]) => ({ length, width, height })),
  taper: fc
    .tuple(size, size, size, size, size, between(-200, 200), between(-200, 200))
    .map(([a, b, c, d, height, sx, sy]) => ({
      bottom: [a, b],
      top: [c, d],
      height,
      shift: [sx, sy],
    })),
  prism: fc
    .tuple(star(), between(0, 12), fc.boolean(), size)
    .map(([points, radius, back, width]) => {
      const profile = points.map(([x, z], i) =>
        i % 2 === 0 && radius > 2 ? [x, z, radius] : [x, z],
      );
      return { profile: back ? [...profile].reverse() : profile, width };
    }),
  stations: fc
    .tuple(
      star(),
      fc.array(fc.tuple(between(50, 400), between(0.4, 1.3), between(-0.1, 0.1)), {
        minLength: 1,
        maxLength: 3,
      }),
    )
    .map(([points, steps]) => {
      let x = 0;
      const stations = [{ x, profile: points.map((p) => [...p]) }];
      for (const [step, scale, twist] of steps) {
        x += step;
        const [c, s] = [scale * Math.cos(twist), scale * Math.sin(twist)];
        stations.push({ x, profile: points.map(([y, z]) => [c * y - s * z, s * y + c * z]) });
      }
      return { stations };
    }),
};

/** A polygon that its middle sees all of, so that it cannot cross itself. */
function star(): fc.Arbitrary<[number, number][]> {
  return fc.array(between(120, 350), { minLength: 4, maxLength: 8 }).map((radii) =>
    radii.map((radius, i): [number, number] => {
      const angle = (2 * Math.PI * i) / radii.length + 0.3;
      return [radius * Math.cos(angle), radius * Math.sin(angle)];
    }),
  );
}

/** The kinds of the format that are written as numbers alone. */
export const plainKinds = Object.keys(kinds);

/** One solid of a kind that can be computed, somewhere near the origin. */
export function plainSolid(kind: string, role = 'holds', turned = true): fc.Arbitrary<PlainSolid> {
  const angle = turned
    ? fc.oneof(fc.constantFrom(0, 0, 90, 180), between(-180, 180))
    : fc.constant(0);
  return fc
    .record({
      sizes: kinds[kind]!,
      at: fc.tuple(between(-250, 250), between(-250, 250), between(-250, 250)),
      turn: fc.tuple(angle, angle, angle),
    })
    .map(({ sizes, at, turn }) => ({ id: kind, role, kind, ...sizes, at, turn }));
}

/** A tank of up to five solids of any kind, at any attitude; plumb depth. */
export function plainTank(most = 5): fc.Arbitrary<PlainDesign> {
  const any = (role: string) =>
    fc.constantFrom(...plainKinds).chain((kind) => plainSolid(kind, role));
  const tilt = fc.oneof(fc.constant(0), between(-35, 35));
  return fc
    .record({
      first: any('holds'),
      rest: fc.array(fc.oneof(any('holds'), any('displaces')), { maxLength: most - 1 }),
      pitch: tilt,
      roll: tilt,
    })
    .map(({ first, rest, pitch, roll }) => ({
      format: 'dipwright-tank',
      version: 1,
      name: 'random tank',
      solids: [first, ...rest].map((solid, i) => ({ ...solid, id: `${solid.kind} ${i}` })),
      attitude: { pitch, roll },
    }));
}
