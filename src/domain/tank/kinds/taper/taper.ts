import { lineInHalfSpaces } from '../../../../geometry/line';
import { dot } from '../../../../geometry/vec3';
import type { Vec3 } from '../../solid';
import type { Kind } from '../kind';
import { measuredSizes } from '../measured-sizes';
import { sizeWords } from '../size-words';
import { taperSchema, type Taper } from './schema';

/** Rectangular frustum: two level rectangles with sides along x and y, the top one of its own size and place. */
export const taper: Kind<Taper> = {
  kind: 'taper',
  label: 'taper',
  schema: taperSchema,
  curved: () => false,
  extent(solid) {
    const [x, y] = [spanOf(solid, 0), spanOf(solid, 1)];
    return [x.high - x.low, y.high - y.low, solid.height];
  },
  axes: null,
  sizes: (solid) => [
    { path: ['bottom', '0'], label: 'bottom x', unit: 'mm' },
    { path: ['bottom', '1'], label: 'bottom y', unit: 'mm' },
    { path: ['top', '0'], label: 'top x', unit: 'mm' },
    { path: ['top', '1'], label: 'top y', unit: 'mm' },
    { path: ['height'], label: 'height', unit: 'mm' },
    ...(solid.shift
      ? ([
          { path: ['shift', '0'], label: 'shift x', unit: 'mm', coordinate: true },
          { path: ['shift', '1'], label: 'shift y', unit: 'mm', coordinate: true },
        ] as const)
      : []),
  ],
  measured: (solid) => measuredSizes(solid, taper.sizes(solid), Math.max(...taper.extent(solid))),
  words: ({ bottom, top, height }) =>
    `${sizeWords(...bottom)} to ${sizeWords(...top)}, ${sizeWords(height)} high`,
  shape(solid) {
    const positions = Float64Array.from(cornersOf(solid).flat());
    return { form: 'mesh', mesh: { positions, triangles: Uint32Array.from(triangles) } };
  },
  support: (solid, up) => Math.max(...cornersOf(solid).map((corner) => dot(up, corner))),
  chords(solid, line, slack) {
    const { height } = solid;
    const sides = [0, 1].flatMap((axis) => {
      const { bottom, top } = spanOf(solid, axis as 0 | 1);
      // a side goes from its low edge to its high edge: height·across − run·z ≤ height·(mean of the two)
      return [1, -1].map((sign) => {
        const end = sign > 0 ? 1 : 0;
        const normal: [number, number, number] = [0, 0, -sign * (top[end] - bottom[end])];
        normal[axis] = sign * height;
        return { normal, offset: (sign * height * (top[end] + bottom[end])) / 2 };
      });
    });
    const chord = lineInHalfSpaces(
      line,
      [
        ...sides,
        { normal: [0, 0, 1], offset: height / 2 },
        { normal: [0, 0, -1], offset: height / 2 },
      ],
      slack,
    );
    return chord ? [chord] : [];
  },
  // the prismatoid rule: the section halfway up has the mean sides, wherever the top stands
  volume({ bottom: [bx, by], top: [tx, ty], height }) {
    const middle = ((bx + tx) / 2) * ((by + ty) / 2);
    return (height / 6) * (bx * by + 4 * middle + tx * ty);
  },
  // every face moves in by the wall, measured square to it; what would close to an edge or a tip is no taper
  eroded(solid, wallMm) {
    const height = solid.height - 2 * wallMm;
    if (!(height > 0)) return null;
    const spans = ([0, 1] as const).map((axis) => {
      const { bottom, top } = spanOf(solid, axis);
      const side = (end: 0 | 1) => {
        const run = top[end] - bottom[end];
        const across = (end === 0 ? 1 : -1) * wallMm * Math.hypot(1, run / solid.height);
        const at = (share: number) => bottom[end] + share * run + across;
        return [at(wallMm / solid.height), at(1 - wallMm / solid.height)] as const;
      };
      const [[bottomFrom, topFrom], [bottomTo, topTo]] = [side(0), side(1)];
      return {
        bottom: bottomTo - bottomFrom,
        top: topTo - topFrom,
        shift: (topFrom + topTo - bottomFrom - bottomTo) / 2,
        middle: (Math.min(bottomFrom, topFrom) + Math.max(bottomTo, topTo)) / 2,
      };
    });
    const [x, y] = [spans[0]!, spans[1]!];
    if (!(Math.min(x.bottom, x.top, y.bottom, y.top) > 0)) return undefined;
    return {
      solid: {
        ...solid,
        bottom: [x.bottom, y.bottom],
        top: [x.top, y.top],
        height,
        shift: [x.shift, y.shift],
      },
      shift: [x.middle, y.middle, 0],
    };
  },
  faults: () => [],
  blank: (id) => ({
    id,
    role: 'holds',
    kind: 'taper',
    bottom: [200, 150],
    top: [600, 400],
    height: 300,
    shift: [0, 0],
  }),
};

interface Span {
  /** Low and high end of the bottom and of the top along an axis, in the own frame. */
  bottom: readonly [number, number];
  top: readonly [number, number];
  low: number;
  high: number;
}

function spanOf({ bottom, top, shift = [0, 0] }: Taper, axis: 0 | 1): Span {
  const [half, halfTop] = [bottom[axis] / 2, top[axis] / 2];
  const [from, to] = [shift[axis] - halfTop, shift[axis] + halfTop];
  const [low, high] = [Math.min(-half, from), Math.max(half, to)];
  const middle = (low + high) / 2;
  return {
    bottom: [-half - middle, half - middle],
    top: [from - middle, to - middle],
    low: low - middle,
    high: high - middle,
  };
}

/** Bottom and top, each against the clock seen from above, from the corner of least x and y. */
function cornersOf(solid: Taper): Vec3[] {
  const [x, y] = [spanOf(solid, 0), spanOf(solid, 1)];
  return (['bottom', 'top'] as const).flatMap((end) => {
    const z = ((end === 'top' ? 1 : -1) * solid.height) / 2;
    const [x0, x1] = x[end];
    const [y0, y1] = y[end];
    return [
      [x0, y0, z],
      [x1, y0, z],
      [x1, y1, z],
      [x0, y1, z],
    ] as const;
  });
}

/** Floor, roof, and two of each side. */
const triangles = [
  [0, 2, 1],
  [0, 3, 2],
  [4, 5, 6],
  [4, 6, 7],
  ...[0, 1, 2, 3].flatMap((i) => {
    const j = (i + 1) % 4;
    return [
      [i, j, 4 + j],
      [i, 4 + j, 4 + i],
    ];
  }),
].flat();
