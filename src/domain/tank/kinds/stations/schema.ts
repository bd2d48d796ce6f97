import { z } from 'zod/v4';
import { coordinate, solidFields } from '../../solid';

const point = z.tuple([coordinate, coordinate], 'Give a point: [y, z].');

const station = z.strictObject({
  /** Place along the hull. */
  x: coordinate,
  /** Once round, every station in the same direction, beginning at the corner that answers the others' first. */
  profile: z
    .array(point, 'Give the profile as a list of points: [y, z].')
    .min(3, 'A profile has at least three points.')
    .max(100, 'The profile of a station has at most 100 points.'),
});

/** A hull by its sections: between two stations every point runs straight to the same point of the next. */
export const stationsSchema = z.strictObject({
  ...solidFields,
  kind: z.literal('stations'),
  /** x rising; places are the hull's own. */
  stations: z
    .array(station, 'Give a list of stations: { "x", "profile" }.')
    .min(2, 'A hull has at least two stations.')
    .max(50, 'A hull has at most 50 stations.'),
});
export type Stations = z.infer<typeof stationsSchema>;
