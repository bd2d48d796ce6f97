import { lineInHalfSpaces } from '../../../../geometry/line';
import type { Kind } from '../kind';
import { sizeWords } from '../size-words';
import { boxSchema, type Box } from './schema';

/** Rectangular box with sharp edges. */
export const box: Kind<Box> = {
  kind: 'box',
  label: 'box',
  schema: boxSchema,
  curved: () => false,
  extent: ({ length, width, height }) => [length, width, height],
  axes: null,
  sizes: () => [
    { path: ['length'], label: 'length', unit: 'mm' },
    { path: ['width'], label: 'width', unit: 'mm' },
    { path: ['height'], label: 'height', unit: 'mm' },
  ],
  words: ({ length, width, height }) => sizeWords(length, width, height),
  shape: ({ length, width, height }) => ({
    form: 'extrusion',
    axis: 'z',
    outline: [
      [-length / 2, -width / 2],
      [length / 2, -width / 2],
      [length / 2, width / 2],
      [-length / 2, width / 2],
    ],
    length: height,
  }),
  support: ({ length, width, height }, up) =>
    (Math.abs(up[0]) * length + Math.abs(up[1]) * width + Math.abs(up[2]) * height) / 2,
  chords({ length, width, height }, line, slack) {
    const chord = lineInHalfSpaces(
      line,
      [
        { normal: [1, 0, 0], offset: length / 2 },
        { normal: [-1, 0, 0], offset: length / 2 },
        { normal: [0, 1, 0], offset: width / 2 },
        { normal: [0, -1, 0], offset: width / 2 },
        { normal: [0, 0, 1], offset: height / 2 },
        { normal: [0, 0, -1], offset: height / 2 },
      ],
      slack,
    );
    return chord ? [chord] : [];
  },
  volume: ({ length, width, height }) => length * width * height,
  faults: () => [],
  blank: (id) => ({ id, role: 'holds', kind: 'box', length: 600, width: 400, height: 300 }),
};
