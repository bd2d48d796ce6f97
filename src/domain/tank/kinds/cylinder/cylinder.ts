import { circleOutline, facetPhase } from '../../../../geometry/circle';
import { lineInBarrel } from '../../../../geometry/line';
import { axisOrder, type Axis } from '../../../../geometry/shape';
import type { Vec3 } from '../../solid';
import type { Kind } from '../kind';
import { sizeWords } from '../size-words';
import { cylinderSchema, type Cylinder } from './schema';

/** Circular cylinder along x, y or z, with flat ends. */
export const cylinder: Kind<Cylinder> = {
  kind: 'cylinder',
  label: 'cylinder',
  schema: cylinderSchema,
  curved: () => 'once',
  extent: (solid) => alongAxis(axisOf(solid), solid.diameter, solid.length),
  axes: { usual: 'x', choices: ['x', 'y', 'z'] },
  sizes: () => [
    { path: ['diameter'], label: 'diameter', unit: 'mm' },
    { path: ['length'], label: 'length', unit: 'mm' },
  ],
  words: (solid) => `⌀ ${sizeWords(solid.diameter, solid.length)} along ${axisOf(solid)}`,
  shape(solid, facets, tank) {
    const axis = axisOf(solid);
    const outline = circleOutline(solid.diameter / 2, facets, facetPhase(axis, tank.x, tank.z));
    return { form: 'extrusion', axis, outline, length: solid.length };
  },
  support(solid, up) {
    const [first, second, third] = axisOrder(axisOf(solid));
    const across = Math.hypot(up[first]!, up[second]!);
    return (across * solid.diameter + Math.abs(up[third]!) * solid.length) / 2;
  },
  chords(solid, line, slack) {
    const radius = solid.diameter / 2;
    const barrel = { axis: axisOf(solid), half: [radius, radius], length: solid.length } as const;
    const chord = lineInBarrel(line, barrel, slack);
    return chord ? [chord] : [];
  },
  volume: ({ diameter, length }) => (Math.PI * diameter * diameter * length) / 4,
  faults: () => [],
  blank: (id) => ({ id, role: 'holds', kind: 'cylinder', diameter: 400, length: 800, axis: 'x' }),
};

function axisOf(solid: Cylinder): Axis {
  return solid.axis ?? 'x';
}

function alongAxis(axis: Axis, across: number, along: number): Vec3 {
  return [
    axis === 'x' ? along : across,
    axis === 'y' ? along : across,
    axis === 'z' ? along : across,
  ];
}
