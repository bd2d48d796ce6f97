import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import { design } from './designs';

/*
 * Nothing of ours is Simpson's rule: a profile runs straight from point to point, so published half-breadths typed as
 * they stand give the trapezoid's area, a little less where the ship is round. But Simpson's rule is the exact area
 * under the parabolas through every three ordinates: drawn by many chords, the same profile gives Simpson's figure.
 */
type Point = [number, number];

/** Half-breadths on the parabolas through every three ordinates, `chords` straight lines to a parabola. */
function onParabolas(ordinates: readonly number[], spacing: number, chords: number): Point[] {
  const points: Point[] = [[0, ordinates[0]!]];
  for (let i = 0; i + 2 < ordinates.length; i += 2) {
    const [a, b, c] = ordinates.slice(i, i + 3) as [number, number, number];
    for (let k = 1; k <= chords; k += 1) {
      const t = (2 * k) / chords; // in spacings
      const y = a + (b - a) * t + ((c - 2 * b + a) / 2) * t * (t - 1);
      points.push([(i + t) * spacing, y]);
    }
  }
  return points;
}

const simpson = (ordinates: readonly number[], spacing: number) =>
  (spacing / 3) *
  ordinates.reduce((sum, y, i) => {
    const last = i === ordinates.length - 1;
    return sum + y * (i === 0 || last ? 1 : i % 2 === 1 ? 4 : 2);
  }, 0);

/** A prism of both halves of a section, 1 m thick; its points [along, half-breadth] in mm. */
function bothHalves(half: readonly Point[]) {
  const outline = [...half, ...half.map(([x, y]): Point => [x, -y]).reverse()].filter(
    ([x, y], i, all) => i === 0 || x !== all[i - 1]![0] || y !== all[i - 1]![1],
  );
  const [first, last] = [outline[0]!, outline.at(-1)!];
  const closed = first[0] === last[0] && first[1] === last[1] ? outline.slice(0, -1) : outline;
  return design([{ id: 'section', role: 'holds', kind: 'prism', profile: closed, width: 1000 }]);
}

describe('midship section of the Cutty Sark, half-breadths every 3.4 ft of 20.4 ft (V3.11)', () => {
  // design calculation of 1869, University of Southampton, EdShare document 4624: half 301.75, section 603.5 ft².
  // The text also misprints h as 204/6 for 20.4/6. One foot is drawn as 100 mm, so 1 ft² × 1 m is 10 L.
  const ordinates = [17.15, 17.4, 17.45, 17.3, 16.1, 10.65, 0.6];
  const areaOf = async (half: readonly Point[]) => {
    const drawn = half.map(([x, y]): Point => [x * 100, y * 100]);
    return (await computeTable(bothHalves(drawn), { stepMm: 500 })).capacityL / 10;
  };

  it('is 603.5 ft² on the parabolas that Simpson takes', async () => {
    expect(simpson(ordinates, 3.4)).toBeCloseTo(301.75, 9);
    const area = await areaOf(onParabolas(ordinates, 3.4, 32));
    expect(Math.abs(area - 603.5)).toBeLessThan(0.03);
    // chords lose as the square of their length, so two drawings tell the limit
    const coarse = await areaOf(onParabolas(ordinates, 3.4, 16));
    expect(area + (area - coarse) / 3).toBeCloseTo(603.5, 6);
  });

  it('is 1.1 % less by the seven half-breadths joined straight: the trapezoid', async () => {
    const area = await areaOf(ordinates.map((y, i): Point => [3.4 * i, y]));
    expect(area).toBeCloseTo(2 * 3.4 * (17.15 / 2 + 17.4 + 17.45 + 17.3 + 16.1 + 10.65 + 0.3), 8);
    expect(area / 603.5).toBeCloseTo(0.989, 3);
  });
});

describe('water plane 120 m long (V3.12)', () => {
  // Derrett, Ship Stability for Masters and Mates, chapter 10: half-ordinates 0 to 0.1 m, area 1207 m², TPC 12.37 t.
  // Drawn at one tenth: the surface of a tank of that plan, in 0.01 of its m².
  it('is 1207 m², and a centimetre of sea water on it 12.37 t', async () => {
    const ordinates = [0, 3.7, 5.9, 7.6, 7.5, 4.6, 0.1];
    const drawn = (chords: number) =>
      bothHalves(onParabolas(ordinates, 20, chords).map(([x, y]): Point => [x * 100, y * 100]));
    const areaOf = async (chords: number) => {
      const [solid] = drawn(chords).solids;
      const lying = design([{ ...solid!, turn: [90, 0, 0] }]);
      const { rows } = await computeTable(lying, { atMm: [0, 500, 1000] });
      // straight sides: the same surface half way up, and the volume grows by it
      expect(rows[2]!.volumeL - rows[1]!.volumeL).toBeCloseTo(rows[1]!.volumeL, 3);
      return (rows[1]!.surfaceCm2 / 1e4) * 100;
    };
    const [fine, coarse] = [await areaOf(32), await areaOf(16)];
    const area = fine + (fine - coarse) / 3;
    expect(area).toBeCloseTo(1206.6667, 3);
    expect(Math.abs(area - 1207)).toBeLessThan(0.5);
    // tonnes per centimetre: area × 0.01 m × 1.025 t/m³
    expect(area * 0.01 * 1.025).toBeCloseTo(12.37, 2);
  });
});
