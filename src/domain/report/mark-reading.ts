import { formatLengthWithUnit } from '../units/format-length';
import { mmPerInch, type LengthUnit } from '../units/length-unit';

/**
 * A level as a mark of the stick, a whole millimetre or a whole eighth of an inch: safe fill is
 * rounded down and the outlet up, so that neither mark stands on the wrong side of its level.
 */
export function markReading(mm: number, unit: LengthUnit, to: 'down' | 'up' | 'nearest'): string {
  const mark = unit === 'in' ? mmPerInch / 8 : 1;
  const marks = mm / mark;
  const whole =
    to === 'down'
      ? Math.floor(marks + 1e-6)
      : to === 'up'
        ? Math.ceil(marks - 1e-6)
        : Math.round(marks);
  return formatLengthWithUnit(whole * mark, unit, unit === 'cm' ? 1 : 0);
}
