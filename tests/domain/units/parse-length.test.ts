import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LengthUnit } from '~/domain/units/length-unit';
import { parseLength } from '~/domain/units/parse-length';
import { formatLength } from '~/domain/units/format-length';

const read = (text: string, unit: LengthUnit): number | string => {
  const answer = parseLength(text, unit);
  return 'mm' in answer ? answer.mm : answer.refused;
};

describe('parseLength reads what people write', () => {
  it.each<[string, LengthUnit, number]>([
    ['412', 'mm', 412],
    ['412', 'cm', 4120],
    ['41.2 cm', 'mm', 412],
    ['16 1/4 in', 'mm', 412.75],
    ['16 4/8', 'in', 419.1], // 16.5 × 25.4
    ['16½', 'in', 419.1],
    ['16⅜"', 'in', 415.925],
    ['½"', 'mm', 12.7],
    ['16.5', 'in', 419.1],
    ['16"', 'mm', 406.4],
    ['16″', 'mm', 406.4],
    ['2*150+12', 'mm', 312],
    ['2 × 150 + 12', 'mm', 312],
    ['2x150', 'mm', 300],
    ['(900 − 100) ÷ 2', 'mm', 400],
    ['5 ft 3 in', 'mm', 1600.2], // 63 × 25.4
    ['5\'3"', 'in', 1600.2],
    ['5′ 3 1/2″', 'in', 1612.9],
    ['5 ft', 'mm', 1524],
    ['1.2 m', 'mm', 1200],
    ['1 m 20 cm', 'mm', 1200],
    ['12 cm + 5 mm', 'mm', 125],
    ['16 in − 1/4 in', 'mm', 400.05],
    ['150 mm/2', 'mm', 75],
    ['1/2 in', 'mm', 12.7],
    ['16.4 in', 'mm', 416.56],
    ['15.75', 'in', 400.05],
    ['-5', 'mm', -5],
    ['1 200', 'mm', 1200],
    ['1\u202f200', 'mm', 1200],
    ['.5 m', 'mm', 500],
  ])('%s in %s is %d mm', (text, unit, mm) => {
    expect(read(text, unit)).toBeCloseTo(mm, 6);
  });
});

describe('parseLength with a comma', () => {
  it.each<[string, number]>([
    ['41,2 cm', 412],
    ['0,125 m', 125],
    ['412,75', 412.75],
  ])('%s is a decimal', (text, mm) => {
    expect(read(text, 'mm')).toBeCloseTo(mm, 6);
  });

  it.each(['1,200', '1,200.5', '1.234,5', '1,2,3', '5,'])('%s is asked back', (text) => {
    expect(read(text, 'mm')).toMatch(/^“.*” can be read in two ways: write .*\.$/);
  });

  it('names both readings of 1,200', () => {
    expect(read('1,200', 'mm')).toBe(
      '“1,200” can be read in two ways: write 1200 for thousands or 1.2 for a decimal.',
    );
  });
});

describe('parseLength beside a stick in eighths', () => {
  it('asks whether 16.4 means tenths or eighths', () => {
    const sentence =
      '16.4 may be tenths or eighths of an inch: write 16 4/8 for eighths, or 16 3/8, the eighth nearest to 16.4.';
    expect(read('16.4', 'in')).toBe(sentence);
    expect(read('16.4 in', 'in')).toBe(sentence);
    expect(read('5 ft 3.4 in', 'in')).toMatch(/may be tenths or eighths/);
  });

  it('names one way when both agree', () => {
    expect(read('16.1', 'in')).toBe(
      '16.1 may be tenths or eighths of an inch: write 16 1/8 for eighths.',
    );
  });

  it('asks whether 16-1/4 takes away', () => {
    expect(read('16-1/4', 'in')).toBe(
      'Write 16 1/4 for 16 and 1/4, or 16 - (1/4) to take it away.',
    );
    expect(read('16 - (1/4)', 'in')).toBeCloseTo(400.05, 6);
  });
});

describe('parseLength refuses in a sentence that says what would be right', () => {
  it.each([
    ['', 'Type a length, such as 412, 41.2 cm or 16 1/4 in.'],
    ['abc', '“abc” is not a unit of length here: use mm, cm, m, in or ft.'],
    ['5 gal', '“gal” is not a unit of length here: use mm, cm, m, in or ft.'],
    ['2 constructor', '“constructor” is not a unit of length here: use mm, cm, m, in or ft.'],
    ['cm', 'Put a number before “cm”, such as 12 cm.'],
    ['12 cm + 3', 'Give every part a unit, or none: mm, cm, m, in or ft.'],
    ['2 cm * 3 cm', 'A length times a length is not a length: multiply by a plain number.'],
    ['12 / (3 cm)', 'Divide by a plain number, not by a length.'],
    ['3/0', 'Nothing can be divided by 0: divide by another number.'],
    ['2 m 30', 'Put +, −, × or ÷ between two numbers.'],
    ['2(3)', 'Put +, −, × or ÷ between two numbers.'],
    ['1'.repeat(81), 'A length is written in at most 80 characters.'],
  ])('%s', (text, sentence) => {
    expect(read(text, 'mm')).toBe(sentence);
  });

  it.each([
    'sin(3)',
    '1:1e7',
    'a=3',
    '[1,2]',
    '{}',
    '"x"',
    '3!',
    '100%',
    '2^9',
    '0x10;1',
    '1e400',
    '(2+3',
    'f(x)=x',
    '2 to 3',
    'x.y',
    '3 > 2',
    '1 ? 2 : 3',
    '1;2',
    '#1',
    '\\u0031',
    '50 25',
    '1/0+',
    '１２',
  ])('%s is no length', (text) => {
    expect(read(text, 'mm')).toMatch(/[.]$/);
  });

  it('is quick and safe on anything at all', () => {
    const started = performance.now();
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ maxLength: 120 }),
          fc
            .array(fc.constantFrom(...'0123456789.,+-*/() inmcft½"\'eE:^'), { maxLength: 80 })
            .map((characters) => characters.join('')),
        ),
        fc.constantFrom<LengthUnit>('mm', 'cm', 'in'),
        (text, unit) => {
          const answer = parseLength(text, unit);
          return 'mm' in answer ? Number.isFinite(answer.mm) : answer.refused.endsWith('.');
        },
      ),
      { numRuns: 3000 },
    );
    expect(performance.now() - started).toBeLessThan(15_000);
  });

  it('deep nesting ends at the cap', () => {
    expect(read(`${'('.repeat(39)}1${')'.repeat(39)}`, 'mm')).toBe(1);
    expect(read('1' + '+1'.repeat(39), 'mm')).toMatch(/cannot be read/);
  });
});

describe('what is printed can be typed again', () => {
  it.each<LengthUnit>(['mm', 'cm', 'in'])('in %s', (unit) => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 800_000 }), (steps) => {
        const mm = unit === 'in' ? (steps * 25.4) / 8 : steps / 10;
        const answer = parseLength(formatLength(mm, unit), unit);
        return 'mm' in answer && Math.abs(answer.mm - mm) < 1e-5;
      }),
    );
  });
});
