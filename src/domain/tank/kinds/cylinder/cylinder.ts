import { barrelProfile } from '../../../../geometry/barrel-profile';
import { circleOutline, facetPhase } from '../../../../geometry/circle';
import { headSupport } from '../../../../geometry/head-support';
import { headVolume } from '../../../../geometry/head-volume';
import { axisOrder } from '../../../../geometry/shape';
import type { Kind, Size } from '../kind';
import { sizeWords } from '../size-words';
import { barrelOf, flatEnds, headOf } from './barrel';
import { endFaults } from './end-faults';
import { endWords } from './end-words';
import { erodedCylinder } from './eroded';
import { lineInCylinder } from './line-in-cylinder';
import { cylinderSchema, type Cylinder, type End } from './schema';

/** Circular cylinder along x, y or z, each end flat, coned, dished, elliptical or torispherical. */
export const cylinder: Kind<Cylinder> = {
  kind: 'cylinder',
  label: 'cylinder',
  schema: cylinderSchema,
  curved: ({ ends = flatEnds }) =>
    ends.every(({ form }) => form === 'flat' || form === 'cone') ? 'once' : 'twice',
  // a knuckle of an eighth of the radius has the fewest chords for its size: 1.8 times a ball's at 32 facets, 1.3 at many
  widestMm: ({ diameter, ends = flatEnds }) =>
    ends.some(({ form }) => form === 'torisphere') ? 2 * diameter : diameter,
  extent(solid) {
    const { axis, overall } = barrelOf(solid);
    const extent: [number, number, number] = [solid.diameter, solid.diameter, solid.diameter];
    extent[axisOrder(axis)[2]] = overall;
    return extent;
  },
  axes: { usual: 'x', choices: ['x', 'y', 'z'] },
  sizes: ({ ends = flatEnds }) => [
    { path: ['diameter'], label: 'diameter', unit: 'mm' },
    { path: ['length'], label: 'length', unit: 'mm' },
    ...ends.flatMap((end, i) => endSizes(end, i)),
  ],
  words(solid) {
    const { axis = 'x', ends = flatEnds } = solid;
    const barrel = `⌀ ${sizeWords(solid.diameter, solid.length)} along ${axis}`;
    return [barrel, endWords(ends)].filter((words) => words !== null).join(', ');
  },
  shape(solid, facets, tank) {
    const { axis, ends } = barrelOf(solid);
    const phase = facetPhase(axis, tank.x, tank.z);
    if (ends.every(({ head }) => head.form === 'flat')) {
      const outline = circleOutline(solid.diameter / 2, facets, phase);
      return { form: 'extrusion', axis, outline, length: solid.length };
    }
    const profile = barrelProfile(ends[0], ends[1], facets);
    return { form: 'revolution', axis, profile, facets, phase, stretch: [1, 1, 1] };
  },
  support(solid, up) {
    const { axis, ends } = barrelOf(solid);
    const [first, second, third] = axisOrder(axis);
    const across = Math.hypot(up[first]!, up[second]!);
    const along = up[third]!;
    return Math.max(
      ...ends.map(
        ({ head, mouth, towards, inward }) =>
          // an end turned inward reaches no further than its rim
          along * mouth +
          (inward ? across * head.radius : headSupport(head, across, towards * along)),
      ),
    );
  },
  chords: (solid, line, slack) => lineInCylinder(line, barrelOf(solid), slack),
  volume(solid) {
    const { diameter, length, ends = flatEnds } = solid;
    return ends.reduce(
      (sum, end) => sum + (end.inward ? -1 : 1) * headVolume(headOf(end, diameter / 2)),
      (Math.PI * diameter * diameter * length) / 4,
    );
  },
  eroded: erodedCylinder,
  faults: endFaults,
  blank: (id) => ({ id, role: 'holds', kind: 'cylinder', diameter: 400, length: 800, axis: 'x' }),
};

function endSizes(end: End, index: number): Size[] {
  const keys =
    end.form === 'flat' ? [] : end.form === 'torisphere' ? ['crown', 'knuckle'] : ['depth'];
  return keys.map((key) => ({
    path: ['ends', String(index), key],
    label: `${index === 0 ? 'low' : 'high'} end ${key}`,
    unit: 'mm',
  }));
}
