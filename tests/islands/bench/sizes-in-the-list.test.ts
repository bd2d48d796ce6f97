import { expect, it } from 'vitest';
import { sizesInTheList } from '~/islands/bench/sizes-in-the-list';
import { blank } from './bench-of-one';

it('says few sizes in the person’s unit, and parts or many of them in words', () => {
  const dished = {
    ...blank('cylinder'),
    diameter: 500,
    length: 1000,
    ends: [
      { form: 'dish', depth: 100 },
      { form: 'dish', depth: 100 },
    ] as [{ form: 'dish'; depth: number }, { form: 'dish'; depth: number }],
  };
  expect(sizesInTheList(blank('box'), 'cm')).toBe('60 × 40 × 30');
  expect(sizesInTheList(blank('prism'), 'mm')).toBe('5 points, 600 × 800 × 300');
  expect(sizesInTheList(blank('prism'), 'in')).toBe('5 points, 600 × 800 × 300 mm');
  expect(sizesInTheList(blank('taper'), 'mm')).toBe('200 × 150 to 600 × 400, 300 high');
  expect(sizesInTheList(dished, 'mm')).toBe('⌀ 500 × 1000 along x, dished ends 100');
  expect(sizesInTheList(dished, 'cm')).toBe('50 × 100 × 10 × 10');
});
