import { facetPhase } from '../../../../geometry/circle';
import { lineInFrustum } from '../../../../geometry/line-in-frustum';
import { axisOrder, type Axis, type Vec2 } from '../../../../geometry/shape';
import type { Kind } from '../kind';
import { sizeWords } from '../size-words';
import { coneSchema, type Cone } from './schema';

/** Frustum of a cone along x, y or z, with flat ends. */
export const cone: Kind<Cone> = {
  kind: 'cone',
  label: 'cone',
  schema: coneSchema,
  curved: () => 'once',
  extent(solid) {
    const widest = Math.max(solid.start, solid.end);
    const extent: [number, number, number] = [widest, widest, widest];
    extent[axisOrder(axisOf(solid))[2]] = solid.length;
    return extent;
  },
  axes: { usual: 'z', choices: ['x', 'y', 'z'] },
  sizes: () => [
    { path: ['start'], label: 'start ⌀', unit: 'mm', mayBeZero: true },
    { path: ['end'], label: 'end ⌀', unit: 'mm', mayBeZero: true },
    { path: ['length'], label: 'length', unit: 'mm' },
  ],
  words: (solid) =>
    `⌀ ${sizeWords(solid.start)} to ⌀ ${sizeWords(solid.end)} × ${sizeWords(solid.length)} along ${axisOf(solid)}`,
  shape(solid, facets, tank) {
    const axis = axisOf(solid);
    const half = solid.length / 2;
    const points: readonly Vec2[] = [
      [0, -half],
      [solid.start / 2, -half],
      [solid.end / 2, half],
      [0, half],
    ];
    // at a tip two of them are one
    const profile = points.filter(
      ([r, z], i) => !points.some(([r2, z2], j) => j < i && r === r2 && z === z2),
    );
    const phase = facetPhase(axis, tank.x, tank.z);
    return { form: 'revolution', axis, profile, facets, phase, stretch: [1, 1, 1] };
  },
  support(solid, up) {
    const [first, second, third] = axisOrder(axisOf(solid));
    const across = Math.hypot(up[first]!, up[second]!);
    const lift = (up[third]! * solid.length) / 2;
    return Math.max((across * solid.start) / 2 - lift, (across * solid.end) / 2 + lift);
  },
  chords(solid, line, slack) {
    const { start, end, length } = solid;
    const chord = lineInFrustum(
      line,
      { axis: axisOf(solid), start: start / 2, end: end / 2, length },
      slack,
    );
    return chord ? [chord] : [];
  },
  volume: ({ start, end, length }) =>
    (Math.PI * length * (start * start + start * end + end * end)) / 12,
  eroded(solid, wallMm) {
    const { start, end, length } = solid;
    const slope = (end - start) / 2 / length;
    // measured across the axis, the wall of a slanted side is thicker by 1/cos
    const across = wallMm * Math.hypot(1, slope);
    const radiusAt = (place: number) => (start + end) / 4 + slope * place - across;
    const tip = slope === 0 ? 0 : (across - (start + end) / 4) / slope;
    let low = wallMm - length / 2;
    let high = length / 2 - wallMm;
    if (radiusAt(low) < 0 && slope > 0) low = tip;
    if (radiusAt(high) < 0 && slope < 0) high = tip;
    if (!(high > low) || !(radiusAt((low + high) / 2) > 0)) return null;
    const diameterAt = (place: number) => Math.max(0, 2 * radiusAt(place));
    const shift: [number, number, number] = [0, 0, 0];
    shift[axisOrder(axisOf(solid))[2]] = (low + high) / 2;
    return {
      solid: {
        ...solid,
        start: low === tip && slope > 0 ? 0 : diameterAt(low),
        end: high === tip && slope < 0 ? 0 : diameterAt(high),
        length: high - low,
      },
      shift,
    };
  },
  faults: ({ start, end }) =>
    start === 0 && end === 0
      ? [{ path: ['end'], detail: 'at least one of the two diameters is more than 0 mm.' }]
      : [],
  blank: (id) => ({
    id,
    role: 'holds',
    kind: 'cone',
    start: 200,
    end: 600,
    length: 400,
    axis: 'z',
  }),
};

function axisOf(solid: Cone): Axis {
  return solid.axis ?? 'z';
}
