import { lineInHalfSpaces } from '../../../../geometry/line';
import { dot } from '../../../../geometry/vec3';
import type { Vec3 } from '../../solid';
import type { Kind } from '../kind';
import { sizeWords } from '../size-words';
import { wedgeSchema, type Wedge } from './schema';

/** Right-triangle prism: full height at x = 0, falling to nothing at x = length. */
export const wedge: Kind<Wedge> = {
  kind: 'wedge',
  label: 'wedge',
  schema: wedgeSchema,
  curved: () => false,
  extent: ({ length, width, height }) => [length, width, height],
  axes: null,
  sizes: () => [
    { path: ['length'], label: 'length', unit: 'mm' },
    { path: ['width'], label: 'width', unit: 'mm' },
    { path: ['height'], label: 'height', unit: 'mm' },
  ],
  words: ({ length, width, height }) => sizeWords(length, width, height),
  // along y the outline is (z, x): low corner, top of the upright face, tip
  shape: ({ length, width, height }) => ({
    form: 'extrusion',
    axis: 'y',
    outline: [
      [-height / 2, -length / 2],
      [height / 2, -length / 2],
      [-height / 2, length / 2],
    ],
    length: width,
  }),
  support({ length, width, height }, up) {
    const corners: readonly Vec3[] = [
      [-length / 2, 0, -height / 2],
      [-length / 2, 0, height / 2],
      [length / 2, 0, -height / 2],
    ];
    return Math.max(...corners.map((corner) => dot(up, corner))) + (Math.abs(up[1]) * width) / 2;
  },
  chords({ length, width, height }, line, slack) {
    const chord = lineInHalfSpaces(
      line,
      [
        { normal: [-1, 0, 0], offset: length / 2 },
        { normal: [0, 1, 0], offset: width / 2 },
        { normal: [0, -1, 0], offset: width / 2 },
        { normal: [0, 0, -1], offset: height / 2 },
        // the slope: z/height + x/length ≤ 0 about the centre of the box
        { normal: [height, 0, length], offset: 0 },
      ],
      slack,
    );
    return chord ? [chord] : [];
  },
  volume: ({ length, width, height }) => (length * width * height) / 2,
  // the triangle stays similar and shrinks about the middle of the circle that touches its three sides
  eroded(solid, wallMm) {
    const touching = (solid.length + solid.height - Math.hypot(solid.length, solid.height)) / 2;
    const left = 1 - wallMm / touching;
    const width = solid.width - 2 * wallMm;
    if (!(left > 0 && width > 0)) return null;
    const length = left * solid.length;
    const height = left * solid.height;
    const moved = (before: number, after: number) => wallMm - (before - after) / 2;
    return {
      solid: { ...solid, length, width, height },
      shift: [moved(solid.length, length), 0, moved(solid.height, height)],
    };
  },
  faults: () => [],
  blank: (id) => ({ id, role: 'displaces', kind: 'wedge', length: 600, width: 400, height: 60 }),
};
