import { describe, expect, it } from 'vitest';
import { parsePlace, parseSize } from '~/islands/bench/parse-typed';

describe('sizes and places typed on the bench', () => {
  it('refuses beside the field what the design could not hold', () => {
    expect(parseSize('mm')('999999999')).toEqual({
      refused: 'A length is at most 100\u202f000\u00a0mm.',
    });
    expect(parseSize('mm')('100 m')).toEqual({ value: 100_000 });
    expect(parsePlace('mm')('-100001')).toEqual({
      refused: 'A place lies within ± 100\u202f000\u00a0mm.',
    });
    expect(parsePlace('mm')('-100000')).toEqual({ value: -100_000 });
  });
});
