import { describe, expect, it } from 'vitest';
import { chartOptions } from '~/domain/report/chart-options';
import { chartReadings, usualStepMm } from '~/domain/report/chart-step';
import { printDate } from '~/domain/report/print-date';

describe('chartOptions', () => {
  it('fills in A4, millimetres and litres', () => {
    expect(chartOptions.parse({})).toEqual({ paper: 'a4', length: 'mm', volume: 'l' });
  });

  it('reads the step from a query', () => {
    expect(chartOptions.parse({ stepMm: '10' }).stepMm).toBe(10);
    expect(chartOptions.parse({ length: 'in', stepMm: '6.35' }).stepMm).toBe(6.35);
  });

  it.each([
    [{ volume: 'gal' }, 'The volume is in l, usgal or impgal: a gallon says which.'],
    [{ paper: 'a3' }, 'The paper is a4 or letter.'],
    [{ length: 'ft' }, 'The length is in mm, cm or in.'],
    [{ stepMm: '0' }, 'A step is 1 mm or more.'],
    [{ stepMm: '2.5' }, 'A step is a whole number of millimetres, such as 5 or 10.'],
    [
      { length: 'in', stepMm: '5' },
      'In inches a step is a number of eighths: 3.175, 6.35, 12.7 or 25.4 mm.',
    ],
    [{ stepMm: 'x' }, 'Give the step of the rows in millimetres.'],
  ])('refuses %o', (query, sentence) => {
    const answer = chartOptions.safeParse(query);
    expect(answer.error?.issues.map(({ message }) => message)).toEqual([sentence]);
  });
});

describe('usual step', () => {
  it.each([
    [300, 'mm', 5],
    [320, 'mm', 10],
    [500, 'mm', 10],
    [620, 'mm', 10],
    [1200, 'mm', 10],
    [1701, 'mm', 20],
    [300, 'cm', 5],
    [100_000, 'mm', 1000],
  ] as const)('%d mm in %s: %d', (height, unit, step) => {
    expect(usualStepMm(height, unit)).toBe(step);
  });

  it('inches: an eighth, a quarter, a half', () => {
    expect(usualStepMm(150, 'in')).toBeCloseTo(3.175, 9);
    expect(usualStepMm(300, 'in')).toBeCloseTo(6.35, 9);
    expect(usualStepMm(1200, 'in')).toBeCloseTo(12.7, 9);
  });
});

describe('readings of the rows', () => {
  it('end at the highest reading, once', () => {
    expect(chartReadings(300, 100)).toEqual([100, 200, 300]);
    expect(chartReadings(250, 100)).toEqual([100, 200, 250]);
    expect(chartReadings(50, 100)).toEqual([50]);
    expect(chartReadings(300 - 1e-9, 100)).toEqual([100, 200, 300 - 1e-9]);
  });
});

describe('printDate', () => {
  it('is read the same everywhere', () => {
    expect(printDate('2026-11-14T23:59:59.000Z')).toBe('14 November 2026');
    expect(() => printDate('soon')).toThrow('a date to print must be a date');
  });
});
