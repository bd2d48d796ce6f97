import { describe, expect, it } from 'vitest';
import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import { formatMass } from '~/domain/units/format-mass';
import { formatNumber } from '~/domain/units/format-number';
import {
  formatPlusMinus,
  formatVolume,
  formatVolumeWithPlusMinus,
} from '~/domain/units/format-volume';
import { decimalsFor, roundTo } from '~/domain/units/rounding';

describe('formatNumber', () => {
  it('sets thin spaces and a true minus sign', () => {
    expect(formatNumber(1234567.891, 1)).toBe('1\u202f234\u202f567.9');
    expect(formatNumber(-12.34, 1)).toBe('\u221212.3');
    expect(formatNumber(-0.04, 1)).toBe('0.0');
    expect(formatNumber(1490.2, -1)).toBe('1\u202f490');
  });

  it('refuses a number that is none', () => {
    expect(() => formatNumber(Number.NaN, 1)).toThrow('a number to print must be finite');
  });

  it('rounds halves away from zero, as paper does', () => {
    expect(roundTo(1.005, 2)).toBe(1.01);
    expect(roundTo(2.5, 0)).toBe(3);
    expect(roundTo(-2.5, 0)).toBe(-3);
    expect(roundTo(1e-9, 2)).toBe(0);
    expect(roundTo(45, -1)).toBe(50);
  });
});

describe('formatLength', () => {
  it('shows what is there', () => {
    expect(formatLength(412, 'mm')).toBe('412');
    expect(formatLength(412.75, 'mm')).toBe('412.75');
    expect(formatLength(412, 'cm')).toBe('41.2');
    expect(formatLength(410, 'cm', 1)).toBe('41.0');
    expect(formatLength(12000, 'mm')).toBe('12\u202f000');
  });

  it('shows inches in eighths, never reduced', () => {
    expect(formatLength(419.1, 'in')).toBe('16 4/8');
    expect(formatLength(12.7, 'in')).toBe('4/8');
    expect(formatLength(406.4, 'in')).toBe('16');
    expect(formatLength(406.3, 'in')).toBe('16');
    expect(formatLength(-12.7, 'in')).toBe('\u22124/8');
    expect(formatLength(0, 'in')).toBe('0');
    expect(formatLengthWithUnit(419.1, 'in')).toBe('16 4/8\u00a0in');
  });
});

describe('digits follow the ±', () => {
  // the rule of the Particle Data Group, from memory: 100–354 two digits, 355–949 one, 950–999 up
  it.each([
    [1.4, 1],
    [3.54, 1],
    [3.4, 1],
    [3.56, 0],
    [0.96, 1],
    [0.94, 1],
    [0.36, 1],
    [0.354, 2],
    [0.05, 2],
    [5, 0],
    [12, 0],
    [35, 0],
    [36, -1],
    [120, -1],
    [1, 1],
    [10, 0],
    [0.1, 2],
    [0, 2],
  ])('± %d gives %d decimals', (plusMinus, decimals) => {
    expect(decimalsFor(plusMinus)).toBe(decimals);
  });

  it('decimals never grow with the ±', () => {
    let last = Infinity;
    for (let plusMinus = 0.01; plusMinus < 1000; plusMinus *= 1.01) {
      const decimals = decimalsFor(plusMinus);
      expect(decimals).toBeLessThanOrEqual(last);
      last = decimals;
    }
  });

  it('litres and gallons', () => {
    expect(formatVolume(55.4999, 'l', 0.97)).toBe('55.5');
    expect(formatPlusMinus(0.97, 'l')).toBe('1.0');
    expect(formatPlusMinus(0.5, 'l')).toBe('0.5');
    expect(formatPlusMinus(1.37, 'l')).toBe('1.4');
    expect(formatVolume(703.46, 'l', 5.2)).toBe('703');
    expect(formatVolume(1490.7, 'l', 12.4)).toBe('1\u202f491');
    expect(formatVolumeWithPlusMinus(180, 'l', 3.4)).toBe('180.0\u00a0±\u00a03.4\u00a0L');
    expect(formatVolumeWithPlusMinus(180, 'usgal', 3.4)).toBe('47.6\u00a0±\u00a00.9\u00a0US gal');
  });

  it('kilograms have no tenths', () => {
    expect(formatMass(142.65, 1.4)).toBe('143');
    expect(formatMass(1879, 44)).toBe('1\u202f880');
  });
});
