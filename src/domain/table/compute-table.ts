import type { TankDocument } from '../tank/document';
import { computeInFull } from './compute-in-full';
import type { ComputedTable, Readings } from './request';

/**
 * The strapping table of a design: published at 2N facets a turn, `errorL` the greatest |V₂ₙ − Vₙ| over its
 * rows and over 200 levels between, and never less than rounding (1e-9 of capacity). Where that passes 1e-6 of
 * capacity N is doubled once more. Error about 1e-8 of capacity at N = 256. Litres, mm, cm². Throws `invalid`
 * with JSON pointers for what cannot be computed.
 */
export async function computeTable(
  document: TankDocument,
  readings: Readings,
): Promise<ComputedTable> {
  return (await computeInFull(document, readings)).table;
}
