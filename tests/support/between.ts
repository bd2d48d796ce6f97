import fc from 'fast-check';

/**
 * Numbers spread evenly from min to max, with the ends, the middle and round shares among them more often.
 * fc.double spreads evenly over what a double can be, so half of its numbers between −250 and 250 are nearer to 0
 * than 1e-150: tanks would all stand at the origin, turned by nothing.
 */
export function between(min: number, max: number): fc.Arbitrary<number> {
  const parts = 2 ** 24;
  const share = fc.oneof(
    { weight: 7, arbitrary: fc.integer({ min: 0, max: parts }).map((part) => part / parts) },
    { weight: 1, arbitrary: fc.constantFrom(0, 0.25, 0.5, 1) },
  );
  return share.map((part) => min + (max - min) * part);
}
