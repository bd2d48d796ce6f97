import type { Interval } from '../../../../geometry/intervals';
import { lineInHalfSpaces } from '../../../../geometry/line';
import { lineInOutline } from '../../../../geometry/line-in-outline';
import { outlineArea } from '../../../../geometry/outline-area';
import { outlinePolygon } from '../../../../geometry/outline-polygon';
import { outlineSupport } from '../../../../geometry/outline-support';
import { cornerArcs } from '../../../../geometry/rounded-outline';
import type { Kind, Size } from '../kind';
import { measuredSizes } from '../measured-sizes';
import { sizeWords } from '../size-words';
import { prismFaults } from './faults';
import { outlineOf } from './outline';
import { prismSchema, type Prism } from './schema';

/** A polygon in x and z, some of its corners rounded, extruded along y. */
export const prism: Kind<Prism> = {
  kind: 'prism',
  label: 'prism',
  schema: prismSchema,
  curved: ({ profile }) => (profile.some(([, , radius = 0]) => radius > 0) ? 'once' : false),
  widestMm(solid) {
    // an arc has a whole number of sixteenths of a turn's facets: its facets are those of a finer circle
    const likeCircles = cornerArcs(outlineOf(solid).outline).map((arc) => {
      if (!arc) return 0;
      const sixteenths = (8 * Math.abs(arc.sweep)) / Math.PI;
      return 2 * arc.radius * (sixteenths / Math.max(1, Math.ceil(sixteenths - 1e-9))) ** 2;
    });
    return Math.max(...likeCircles);
  },
  extent(solid) {
    const { x, z } = outlineOf(solid);
    return [x, solid.width, z];
  },
  axes: null,
  sizes: ({ profile }) => [
    ...profile.flatMap((point, i): Size[] =>
      point.map((_, part) => {
        const size = { path: ['profile', String(i), String(part)], unit: 'mm' } as const;
        const label = `${i + 1} ${['x', 'z', 'radius'][part]!}`;
        return part < 2
          ? { ...size, label, coordinate: true }
          : { ...size, label, mayBeZero: true };
      }),
    ),
    { path: ['width'], label: 'width', unit: 'mm' },
  ],
  measured: (solid) => measuredSizes(solid, prism.sizes(solid), Math.max(...prism.extent(solid))),
  words(solid) {
    const { x, z } = outlineOf(solid);
    return `${solid.profile.length} points, ${sizeWords(x, solid.width, z)}`;
  },
  shape(solid, facets) {
    const { points, straight } = outlinePolygon(outlineOf(solid).outline, facets);
    return { form: 'extrusion', axis: 'y', outline: points, length: solid.width, flat: straight };
  },
  support: (solid, up) =>
    outlineSupport(outlineOf(solid).outline, [up[2], up[0]]) + (Math.abs(up[1]) * solid.width) / 2,
  chords(solid, line, slack) {
    const half = solid.width / 2;
    const between = lineInHalfSpaces(
      line,
      [
        { normal: [0, 1, 0], offset: half },
        { normal: [0, -1, 0], offset: half },
      ],
      slack,
    );
    if (!between) return [];
    const { outline } = outlineOf(solid);
    const { origin, direction } = line;
    return lineInOutline(
      { corners: outline.corners, arcs: cornerArcs(outline) },
      [origin[2], origin[0]],
      [direction[2], direction[0]],
      slack,
    ).flatMap((one): Interval[] => {
      const from = Math.max(one.from, between.from);
      const to = Math.min(one.to, between.to);
      return to >= from ? [{ from, to }] : [];
    });
  },
  volume: (solid) => outlineArea(outlineOf(solid).outline) * solid.width,
  faults: prismFaults,
  // a bilge: keel down, sides standing on the turn of it
  blank: (id) => ({
    id,
    role: 'holds',
    kind: 'prism',
    profile: [
      [300, 0],
      [600, 120],
      [600, 300],
      [0, 300],
      [0, 120],
    ],
    width: 800,
  }),
};
