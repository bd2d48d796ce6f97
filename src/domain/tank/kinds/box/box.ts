import { lineInHalfSpaces } from '../../../../geometry/line';
import { lineInRoundedBox } from '../../../../geometry/line-in-rounded-box';
import { roundedBoxSupport, roundedBoxVolume } from '../../../../geometry/rounded-box';
import { roundedBoxShape } from '../../../../geometry/rounded-box-shape';
import type { Kind, Size } from '../kind';
import { measuredSizes, withSizes } from '../measured-sizes';
import { sizeWords } from '../size-words';
import { edgeFaults, roundedOf } from './edges';
import { boxSchema, type Box } from './schema';

const axes = ['x', 'y', 'z'] as const;

/** Rectangular box, its edges sharp, or rounded as a ball rolls along them. */
export const box: Kind<Box> = {
  kind: 'box',
  label: 'box',
  schema: boxSchema,
  curved(solid) {
    const rounded = roundedOf(solid);
    if (!rounded) return false;
    return rounded.rim === 0 ? 'once' : 'twice';
  },
  extent: ({ length, width, height }) => [length, width, height],
  axes: null,
  sizes: ({ edges = {} }) => [
    { path: ['length'], label: 'length', unit: 'mm' },
    { path: ['width'], label: 'width', unit: 'mm' },
    { path: ['height'], label: 'height', unit: 'mm' },
    ...axes
      .filter((axis) => edges[axis] !== undefined)
      .map((axis): Size => ({
        path: ['edges', axis],
        label: `edges ${axis}`,
        unit: 'mm',
        mayBeZero: true,
      })),
  ],
  measured(solid) {
    const { edges = {} } = solid;
    const lengths = box.sizes(solid).filter(({ path }) => path[0] !== 'edges');
    // equal radii are one length: nobody measures twelve edges apart
    const radii = [...new Set(axes.map((axis) => edges[axis] ?? 0))].filter((radius) => radius > 0);
    return [
      ...measuredSizes(solid, lengths, 0),
      ...radii.map((radius) => {
        const paths = axes.filter((axis) => edges[axis] === radius).map((axis) => ['edges', axis]);
        return {
          path: paths[0]!,
          sizeMm: radius,
          grown: (byMm: number) => withSizes(solid, paths, radius + byMm),
        };
      }),
    ];
  },
  words({ length, width, height, edges = {} }) {
    const sizes = sizeWords(length, width, height);
    const round = axes.filter((axis) => (edges[axis] ?? 0) > 0);
    if (round.length === 0) return sizes;
    return `${sizes}, edges ${round.map((axis) => `${axis} ${sizeWords(edges[axis]!)}`).join(', ')}`;
  },
  shape(solid, facets) {
    const rounded = roundedOf(solid);
    if (rounded) return roundedBoxShape(rounded, facets);
    const { length, width, height } = solid;
    return {
      form: 'extrusion',
      axis: 'z',
      outline: [
        [-length / 2, -width / 2],
        [length / 2, -width / 2],
        [length / 2, width / 2],
        [-length / 2, width / 2],
      ],
      length: height,
    };
  },
  support(solid, up) {
    const rounded = roundedOf(solid);
    if (rounded) return roundedBoxSupport(rounded, up);
    const { length, width, height } = solid;
    return (Math.abs(up[0]) * length + Math.abs(up[1]) * width + Math.abs(up[2]) * height) / 2;
  },
  chords(solid, line, slack) {
    const rounded = roundedOf(solid);
    const { length, width, height } = solid;
    const chord = rounded
      ? lineInRoundedBox(line, rounded, slack)
      : lineInHalfSpaces(
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
  volume(solid) {
    const rounded = roundedOf(solid);
    return rounded ? roundedBoxVolume(rounded) : solid.length * solid.width * solid.height;
  },
  eroded(solid, wallMm) {
    const [length, width, height] = [solid.length, solid.width, solid.height].map(
      (size) => size - 2 * wallMm,
    ) as [number, number, number];
    if (!(Math.min(length, width, height) > 0)) return null;
    const { edges } = solid;
    // a fillet stays round about the same middle, until nothing is left of it
    const less = (radius = 0) => Math.max(radius - wallMm, 0);
    const left = edges && { edges: { x: less(edges.x), y: less(edges.y), z: less(edges.z) } };
    return { solid: { ...solid, length, width, height, ...left }, shift: [0, 0, 0] };
  },
  faults: edgeFaults,
  blank: (id) => ({ id, role: 'holds', kind: 'box', length: 600, width: 400, height: 300 }),
};
