import { expect, it } from 'vitest';
import { letterAfter, revisionLetter } from '~/domain/tank/revision-letter';

const counted: [number, string][] = [
  [1, 'A'],
  [2, 'B'],
  [26, 'Z'],
  [27, 'AA'],
  [52, 'AZ'],
  [53, 'BA'],
  [702, 'ZZ'],
  [703, 'AAA'],
];

it.each(counted)('revision %i has the letter %s', (number, letter) => {
  expect(revisionLetter(number)).toBe(letter);
});

it('the letter after each is that of the next number, and A is the first', () => {
  expect(letterAfter(null)).toBe('A');
  for (const [number, letter] of counted) {
    expect(letterAfter(letter)).toBe(revisionLetter(number + 1));
  }
});
