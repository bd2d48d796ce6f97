import type { LengthUnit } from '~/domain/units/length-unit';

/** What an arrow key adds to a length, mm: the smallest step that is read on a rule of the unit. */
export function stepOf(unit: LengthUnit): number {
  if (unit === 'in') return 25.4 / 8;
  return unit === 'cm' ? 10 : 1;
}
