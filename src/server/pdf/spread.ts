/**
 * Middles of labels that stand as near as they can to where they belong without covering each other.
 * @param wanted ascending places
 * @param pitch least distance between two of them
 */
export function spread(
  wanted: readonly number[],
  pitch: number,
  low: number,
  high: number,
): number[] {
  const places = wanted.map((place) => Math.min(Math.max(place, low), high));
  for (let i = 1; i < places.length; i += 1) {
    places[i] = Math.max(places[i]!, places[i - 1]! + pitch);
  }
  let ceiling = high;
  for (let i = places.length - 1; i >= 0; i -= 1) {
    places[i] = Math.min(places[i]!, ceiling);
    ceiling = places[i]! - pitch;
  }
  return places;
}
