/**
 * Marks of a graduated rail: how far apart they stand so that they can be read.
 * Decimal units climb 1, 2, 5, 10, 20, 25, 50 …; inches halve down to an eighth.
 */
export interface Marks {
  /** Distance between numbered marks, in the unit of the scale. */
  numbered: number;
  /** Distance between the fine marks; divides `numbered`. */
  fine: number;
}

/**
 * @param span length of the scale in its unit (> 0)
 * @param most most numbered marks that fit side by side (≥ 1)
 * @param mostFine most fine marks that fit
 * @param eighths true for a scale in inches
 */
export function marksFor(span: number, most: number, mostFine: number, eighths = false): Marks {
  const ladder = eighths ? inchLadder : decimalLadder(span);
  const numbered = ladder.find((step) => span / step <= most) ?? span;
  const fine =
    ladder.find((step) => span / step <= mostFine && divides(step, numbered)) ?? numbered;
  return { numbered, fine };
}

/** The multiples of `step` from 0 to `span`, both included where they fall on it. */
export function multiples(step: number, span: number): number[] {
  const count = Math.floor(span / step + 1e-9);
  return Array.from({ length: count + 1 }, (_, index) => index * step);
}

const inchLadder = [0.125, 0.25, 0.5, 1, 2, 4, 6, 12, 24, 48, 96, 192, 480, 960];

function decimalLadder(span: number): number[] {
  const lowest = Math.floor(Math.log10(span)) - 3;
  return Array.from({ length: 6 }, (_, decade) =>
    [1, 2, 2.5, 5].map((digit) => digit * 10 ** (lowest + decade)),
  )
    .flat()
    .filter((step) => step >= 10 || !/25/.test(String(Number(step.toPrecision(6)))));
}

function divides(step: number, whole: number): boolean {
  const ratio = whole / step;
  return Math.abs(ratio - Math.round(ratio)) < 1e-9;
}
