import { lineInLoft } from '../../../../geometry/line-in-loft';
import { loftVolume } from '../../../../geometry/loft';
import { flatFacesOf } from '../../../../geometry/loft-faces';
import { isTwisted, loftMesh } from '../../../../geometry/loft-mesh';
import type { Kind, Size } from '../kind';
import { measuredSizes } from '../measured-sizes';
import { sizeWords } from '../size-words';
import { stationFaults } from './faults';
import { loftOf } from './loft';
import { stationsSchema, type Stations } from './schema';

/** A hull by its sections: between two stations every point runs straight to the same point of the next. */
export const stations: Kind<Stations> = {
  kind: 'stations',
  label: 'stations',
  schema: stationsSchema,
  curved: (solid) => (isTwisted(loftOf(solid).loft) ? 'twice' : false),
  extent: (solid) => loftOf(solid).extent,
  axes: null,
  sizes: (solid) =>
    solid.stations.flatMap(({ profile }, i): Size[] => [
      {
        path: ['stations', String(i), 'x'],
        label: `station ${i + 1} x`,
        unit: 'mm',
        coordinate: true,
      },
      ...profile.flatMap((_, j) =>
        ['y', 'z'].map((name, part): Size => ({
          path: ['stations', String(i), 'profile', String(j), String(part)],
          label: `station ${i + 1}, ${j + 1} ${name}`,
          unit: 'mm',
          coordinate: true,
        })),
      ),
    ]),
  measured: (solid) =>
    measuredSizes(solid, stations.sizes(solid), Math.max(...stations.extent(solid))),
  words: (solid) =>
    `${solid.stations.length} stations of ${solid.stations[0]!.profile.length} points, ${sizeWords(...loftOf(solid).extent)}`,
  shape(solid, facets) {
    const { loft } = loftOf(solid);
    return { form: 'mesh', mesh: loftMesh(loft, facets), flat: flatFacesOf(loft) };
  },
  // a patch has its extremes at its corners, since it is straight both ways
  support(solid, up) {
    const { x, sections } = loftOf(solid).loft;
    const levels = sections.flatMap((section, i) =>
      section.map(([y, z]) => up[0] * x[i]! + up[1] * y + up[2] * z),
    );
    return Math.max(...levels);
  },
  chords: (solid, line, slack) => lineInLoft(line, loftOf(solid).loft, slack),
  volume: (solid) => loftVolume(loftOf(solid).loft),
  faults: stationFaults,
  // a small hull: transom, middle, and a bow that draws in and rises
  blank: (id) => ({
    id,
    role: 'holds',
    kind: 'stations',
    stations: [
      { x: 0, profile: section(0, 250, 120, 300, 400) },
      { x: 600, profile: section(0, 230, 140, 300, 410) },
      { x: 1200, profile: section(150, 60, 260, 80, 440) },
    ],
  }),
};

/** Keel, chines and sheer, the same on both sides. */
function section(
  keelZ: number,
  chineY: number,
  chineZ: number,
  sheerY: number,
  sheerZ: number,
): [number, number][] {
  return [
    [0, keelZ],
    [chineY, chineZ],
    [sheerY, sheerZ],
    [-sheerY, sheerZ],
    [-chineY, chineZ],
  ];
}
