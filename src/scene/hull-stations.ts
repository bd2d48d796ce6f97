import type { TankDocument } from '~/domain/tank/document';
import type { Stations } from '~/domain/tank/kinds/stations/schema';
import { resizeSolid } from './commands';
import { midwayOn } from './midway-on';

type Station = Stations['stations'][number];
export type StationPoint = Station['profile'][number];

/** A copy of the last station, as far beyond it as it stands beyond the one before. */
export function addStation(document: TankDocument, id: string): TankDocument {
  return changeStations(document, id, (stations) => {
    const [before, last] = stations.slice(-2);
    if (!before || !last) return stations;
    const copy = structuredClone(last);
    return [...stations, { ...copy, x: last.x + Math.max(last.x - before.x, 1) }];
  });
}

export function removeStation(document: TankDocument, id: string, index: number): TankDocument {
  return changeStations(document, id, (stations) => stations.toSpliced(index, 1));
}

/** Whether all stations have as many points, so that point answers point. */
export function areEven(stations: readonly Station[]): boolean {
  return stations.every(({ profile }) => profile.length === stations[0]!.profile.length);
}

/**
 * A new point on the middle of the side after a point: in every station, since they have to have as many; in this one
 * alone while they have not.
 */
export function addStationPoint(
  document: TankDocument,
  id: string,
  index: number,
  after: number,
): TankDocument {
  return changeProfiles(document, id, index, (profile) =>
    profile.toSpliced(after + 1, 0, midwayOn(profile, after)),
  );
}

/** Takes a point away, from every station where they have as many. */
export function removeStationPoint(
  document: TankDocument,
  id: string,
  index: number,
  point: number,
): TankDocument {
  return changeProfiles(document, id, index, (profile) => profile.toSpliced(point, 1));
}

/** Takes other points from one on, to the end of one station's profile. */
export function replaceStationPoints(
  document: TankDocument,
  id: string,
  index: number,
  from: number,
  points: readonly StationPoint[],
): TankDocument {
  return changeStations(document, id, (stations) =>
    stations.with(index, {
      ...stations[index]!,
      profile: [...stations[index]!.profile.slice(0, from), ...points],
    }),
  );
}

function changeProfiles(
  document: TankDocument,
  id: string,
  index: number,
  change: (profile: Station['profile']) => Station['profile'],
): TankDocument {
  return changeStations(document, id, (stations) => {
    const even = areEven(stations);
    return stations.map((station, i) =>
      even || i === index ? { ...station, profile: change(station.profile) } : station,
    );
  });
}

function changeStations(
  document: TankDocument,
  id: string,
  change: (stations: Station[]) => Station[],
): TankDocument {
  return resizeSolid(document, id, (solid) =>
    solid.kind === 'stations' ? { ...solid, stations: change(solid.stations) } : solid,
  );
}
