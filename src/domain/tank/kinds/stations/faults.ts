import { crossingBetween } from '../../../../geometry/loft-crossing';
import { polygonArea } from '../../../../geometry/outline-area';
import { thinMm } from '../../../../geometry/tolerance';
import { profileFaults, type ProfileFault } from '../profile-faults';
import { sizeWords } from '../size-words';
import type { Stations } from './schema';

const mostPoints = 1000;

/** What stations cannot be: uneven, out of order, crossing themselves or between each other. */
export function stationFaults({ stations }: Stations): ProfileFault[] {
  const faults: ProfileFault[] = [];
  const fault = (path: readonly (string | number)[], detail: string) =>
    faults.push({ path: ['stations', ...path.map(String)], detail });
  const [first] = stations;
  const count = first!.profile.length;
  if (stations.length * count > mostPoints) {
    fault([], `all profiles together have at most ${mostPoints} points.`);
    return faults;
  }
  stations.forEach(({ x, profile }, i) => {
    if (profile.length !== count) {
      fault(
        [i, 'profile'],
        `station ${i + 1} has ${profile.length} points and station 1 has ${count}: all have as many.`,
      );
    }
    const before = stations[i - 1];
    if (before && x < before.x + thinMm) {
      fault(
        [i, 'x'],
        `x rises from station to station by at least ${thinMm} mm: station ${i + 1} stands at ${sizeWords(x)}, the one before it at ${sizeWords(before.x)}.`,
      );
    }
  });
  if (faults.length > 0) return faults;

  faults.push(
    ...stations.flatMap(({ profile }, i) =>
      profileFaults(profile, ['stations', String(i), 'profile']),
    ),
  );
  if (faults.length > 0) return faults;

  const way = Math.sign(polygonArea(first!.profile));
  stations.forEach(({ profile }, i) => {
    if (Math.sign(polygonArea(profile)) === way) return;
    fault(
      [i, 'profile'],
      `the points of station ${i + 1} run the other way round than those of station 1: give all of them in one direction.`,
    );
  });
  if (faults.length > 0) return faults;

  stations.slice(1).forEach(({ x, profile }, i) => {
    const crossing = crossingBetween(stations[i]!.profile, profile);
    if (!crossing) return;
    const { corner, side, share } = crossing;
    const from = stations[i]!.x;
    fault(
      [i + 1, 'profile'],
      `between stations ${i + 1} and ${i + 2}, at x ${sizeWords(from + share * (x - from))}, point ${corner + 1} meets the side from point ${side + 1} to point ${((side + 1) % count) + 1}: let point by point of the two answer each other, or put a station between.`,
    );
  });
  return faults;
}
