import { volumeAt, type Curve } from '~/domain/table/curve';

/**
 * The one sentence that a fitter will remember of a tank: what half the stick holds, in the
 * nearest plain fraction. Within 2 % of brim of the true share; "just about" says it is not exact.
 */
export function sentenceToRemember(curve: Curve, heightMm: number, capacityL: number): string {
  const share = volumeAt(curve, heightMm / 2) / capacityL;
  const [words, nearest] = fractions.reduce((best, one) =>
    Math.abs(one[1] - share) < Math.abs(best[1] - share) ? one : best,
  );
  const gap = Math.abs(nearest - share);
  if (gap < 0.004) return `Half the stick is ${words} of the tank.`;
  if (gap < 0.02) return `Half the stick is just about ${words} of the tank.`;
  return `Half the stick is ${Math.round(share * 100)} % of the tank.`;
}

const fractions: [string, number][] = [
  ['a tenth', 1 / 10],
  ['an eighth', 1 / 8],
  ['a sixth', 1 / 6],
  ['a fifth', 1 / 5],
  ['a quarter', 1 / 4],
  ['a third', 1 / 3],
  ['two fifths', 2 / 5],
  ['half', 1 / 2],
  ['three fifths', 3 / 5],
  ['two thirds', 2 / 3],
  ['three quarters', 3 / 4],
  ['four fifths', 4 / 5],
];
