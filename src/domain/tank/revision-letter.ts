/** The letter of a tank's n-th revision (n ≥ 1): A … Z, AA, AB … */
export function revisionLetter(number: number): string {
  const before = Math.floor((number - 1) / 26);
  const last = String.fromCharCode(65 + ((number - 1) % 26));
  return before === 0 ? last : revisionLetter(before) + last;
}

/** The letter after another one, as `revisionLetter` counts; the first when there is none yet. */
export function letterAfter(letter: string | null): string {
  const number = [...(letter ?? '')].reduce((sum, one) => sum * 26 + one.charCodeAt(0) - 64, 0);
  return revisionLetter(number + 1);
}
