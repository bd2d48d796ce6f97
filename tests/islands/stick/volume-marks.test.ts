import { describe, expect, it } from 'vitest';
import { volumeMarks } from '~/islands/stick/volume-marks';

/** y of a volume in a V hull, V = brim (h/H)², on a rail of 380 px. */
const vHull = (brim: number) => (litres: number) => 380 * (1 - Math.sqrt(litres / brim));
/** y of a volume in a box. */
const box = (brim: number) => (litres: number) => 400 * (1 - litres / brim);

describe('numbers of the litre scale', () => {
  it('leaves no round step out for a finer one: 20 stands between 10 and 40', () => {
    const values = volumeMarks(0, 180, vHull(180), 9).map(({ value }) => value);
    expect(values).toEqual([5, 10, 20, 40, 60, 80, 100, 120, 140, 160]);
  });

  it('halves a step before it goes finer: 5 under 10, not 6', () => {
    // a lying cylinder, roughly V ~ h^1.5 at its foot
    const yOf = (litres: number) => 330 * (1 - (litres / 82) ** (2 / 3));
    const values = volumeMarks(0, 82, yOf, 9).map(({ value }) => value);
    expect(values.filter((value) => value <= 20)).toEqual([2, 5, 10, 20]);
  });

  it('never crowds', () => {
    for (const brim of [30, 130, 162, 820, 2262]) {
      for (const yOf of [vHull(brim), box(brim)]) {
        const marks = volumeMarks(0, brim, yOf, 9);
        expect(marks.length).toBeGreaterThan(4);
        marks.slice(1).forEach(({ y }, i) => expect(marks[i]!.y - y).toBeGreaterThanOrEqual(17));
      }
    }
  });

  it('writes round figures only, also in a tank of 2262 L', () => {
    for (const { value } of volumeMarks(0, 2262, vHull(2262), 9)) expect(value % 10).toBe(0);
  });
});
