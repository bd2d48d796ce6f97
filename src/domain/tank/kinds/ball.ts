import { ballProfile } from '../../../geometry/ball-profile';
import { facetPhase } from '../../../geometry/circle';
import type { Interval } from '../../../geometry/intervals';
import { lineInQuadric, type Line } from '../../../geometry/line';
import type { Shape } from '../../../geometry/shape';
import type { Vec3 } from '../solid';
import type { TankDirections } from './kind';

/** What sphere and ellipsoid share: a ball stretched to three sizes along x, y, z, mm. */
export const ball = {
  shape(sizes: Vec3, facets: number, tank: TankDirections): Shape {
    const widest = Math.max(...sizes);
    return {
      form: 'revolution',
      axis: 'z',
      profile: ballProfile(widest / 2, facets),
      facets,
      phase: facetPhase('z', tank.x, tank.z),
      stretch: [sizes[0] / widest, sizes[1] / widest, sizes[2] / widest],
    };
  },
  support: (sizes: Vec3, up: Vec3): number =>
    Math.hypot(sizes[0] * up[0], sizes[1] * up[1], sizes[2] * up[2]) / 2,
  chords(sizes: Vec3, line: Line, slack: number): readonly Interval[] {
    const chord = lineInQuadric(line, [sizes[0] / 2, sizes[1] / 2, sizes[2] / 2], slack);
    return chord ? [chord] : [];
  },
  volume: (sizes: Vec3): number => (Math.PI * sizes[0] * sizes[1] * sizes[2]) / 6,
};
