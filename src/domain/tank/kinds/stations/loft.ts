import type { Loft } from '../../../../geometry/loft';
import { polygonArea } from '../../../../geometry/outline-area';
import type { Vec2 } from '../../../../geometry/shape';
import type { Vec3 } from '../../solid';
import type { Stations } from './schema';

/** A hull in its own frame and the lengths of its box, mm: sections against the clock, about the middle of the box. */
export function loftOf({ stations }: Stations): { loft: Loft; extent: Vec3 } {
  const places = stations.flatMap(({ x, profile }) => profile.map(([y, z]) => [x, y, z] as const));
  const middle = [0, 1, 2].map((axis) => {
    const along = places.map((place) => place[axis]!);
    const [low, high] = [Math.min(...along), Math.max(...along)];
    return { at: (low + high) / 2, length: high - low };
  });
  const [x, y, z] = middle as [(typeof middle)[0], (typeof middle)[0], (typeof middle)[0]];
  // all stations run the way the first does, or are refused
  const turned = polygonArea(stations[0]!.profile) < 0;
  const sections = stations.map(({ profile }) => {
    const section = profile.map(([py, pz]): Vec2 => [py - y.at, pz - z.at]);
    return turned ? section.reverse() : section;
  });
  const loft = { x: stations.map((station) => station.x - x.at), sections };
  return { loft, extent: [x.length, y.length, z.length] };
}
