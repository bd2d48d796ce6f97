import { marksFor, multiples } from '~/domain/units/marks';

export interface VolumeMark {
  /** In the unit of the scale. */
  value: number;
  /** On the screen, px. */
  y: number;
}

/** Least px between two numbers of the scale. */
const apartPx = 17;

/**
 * The numbered marks of a volume scale. Round steps come first; the low end of a narrowing tank
 * gets finer ones where they have room between those.
 *
 * @param least what the tank holds at the foot of the rail, in the unit of the scale
 * @param most what it holds at its top
 * @param yOf where a volume stands; px, downward
 * @param topPx least y of a number, below the rail's own top
 */
export function volumeMarks(
  least: number,
  most: number,
  yOf: (value: number) => number,
  topPx: number,
): VolumeMark[] {
  const { numbered } = marksFor(most, 10, 10);
  const taken: VolumeMark[] = [];
  const take = (value: number) => {
    if (value <= least || value > most) return;
    const y = yOf(value);
    const free = taken.every((one) => Math.abs(one.y - y) >= apartPx);
    if (y >= topPx && free) taken.push({ value, y });
  };
  multiples(numbered, most).forEach(take);
  for (const parts of finerParts(leadingDigits(numbered))) {
    multiples(numbered / parts, numbered).forEach(take);
  }
  return taken.sort((a, b) => a.value - b.value);
}

/** Into how many a step is parted, the rounder first: 10 into 5s then 2s, 20 into 10s then 5s. */
function finerParts(leading: number): number[] {
  if (leading === 10) return [2, 5];
  return leading === 20 ? [2, 4] : [5];
}

/** 25 of 0.25, 2.5 and 250; 20 of 2. */
function leadingDigits(step: number): number {
  return Math.round(step / 10 ** (Math.floor(Math.log10(step) + 1e-9) - 1));
}
