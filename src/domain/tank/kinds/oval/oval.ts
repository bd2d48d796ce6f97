import { ellipseOutline, facetPhase } from '../../../../geometry/circle';
import { lineInBarrel } from '../../../../geometry/line';
import { axisOrder } from '../../../../geometry/shape';
import type { Kind } from '../kind';
import { sizeWords } from '../size-words';
import { ovalSchema, type Oval } from './schema';

/** Elliptic cylinder along x or y, with flat ends. */
export const oval: Kind<Oval> = {
  kind: 'oval',
  label: 'oval',
  schema: ovalSchema,
  curved: () => 'once',
  extent: (solid) =>
    axisOf(solid) === 'x'
      ? [solid.length, solid.width, solid.height]
      : [solid.width, solid.length, solid.height],
  axes: { usual: 'x', choices: ['x', 'y'] },
  sizes: () => [
    { path: ['length'], label: 'length', unit: 'mm' },
    { path: ['width'], label: 'width', unit: 'mm' },
    { path: ['height'], label: 'height', unit: 'mm' },
  ],
  words: (solid) => `${sizeWords(solid.length, solid.width, solid.height)} along ${axisOf(solid)}`,
  shape(solid, facets, tank) {
    const axis = axisOf(solid);
    const [a, b] = halves(solid);
    // the direction met on the ellipse is that of the circle before it was stretched
    const phase = facetPhase(axis, tank.x, tank.z);
    const onCircle = Math.atan2(Math.sin(phase) / b, Math.cos(phase) / a);
    return {
      form: 'extrusion',
      axis,
      outline: ellipseOutline(a, b, facets, onCircle),
      length: solid.length,
    };
  },
  support(solid, up) {
    const [first, second, third] = axisOrder(axisOf(solid));
    const [a, b] = halves(solid);
    return Math.hypot(a * up[first]!, b * up[second]!) + (Math.abs(up[third]!) * solid.length) / 2;
  },
  chords(solid, line, slack) {
    const chord = lineInBarrel(
      line,
      { axis: axisOf(solid), half: halves(solid), length: solid.length },
      slack,
    );
    return chord ? [chord] : [];
  },
  volume: ({ length, width, height }) => (Math.PI * length * width * height) / 4,
  faults: () => [],
  blank: (id) => ({
    id,
    role: 'holds',
    kind: 'oval',
    length: 800,
    width: 500,
    height: 350,
    axis: 'x',
  }),
};

function axisOf(solid: Oval): 'x' | 'y' {
  return solid.axis ?? 'x';
}

/** Half-axes along the outline's two directions: (y, z) for x, (z, x) for y. */
function halves(solid: Oval): readonly [number, number] {
  const { width, height } = solid;
  return axisOf(solid) === 'x' ? [width / 2, height / 2] : [height / 2, width / 2];
}
