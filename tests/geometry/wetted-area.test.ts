import { describe, expect, it } from 'vitest';
import { upVector } from '~/geometry/attitude';
import { levels } from '~/geometry/mesh';
import { wettedArea } from '~/geometry/wetted-area';
import { unit, type Vec3 } from '~/geometry/vec3';
import { boxShape, cornerTetrahedron, cylinderShape, meshFrom } from './solids';

const up: Vec3 = [0, 0, 1];

function even(low: number, high: number, count: number): Float64Array {
  return Float64Array.from({ length: count }, (_, i) => low + ((high - low) * i) / (count - 1));
}

describe('the wetted area', () => {
  it('of a box is its floor and its four walls, exactly: the lid stays dry', () => {
    const mesh = meshFrom([boxShape([900, 500, 300])]);
    const at = Float64Array.of(0, 75, 150, 300);
    const floor = 900 * 500;
    const round = 2 * (900 + 500);
    expect([...wettedArea(mesh, up, at)]).toEqual([...at].map((h) => floor + round * h));
  });

  it('of a box that stands on its edge: two rectangles and two triangles, then what is left of them', () => {
    // turned by 45° about y: below the middle corner the ends are right triangles with legs h·√2
    const mesh = meshFrom([boxShape([400, 700, 400])]);
    const direction = unit([1, 0, 1]);
    const at = Float64Array.of(50, 200, 400 / Math.SQRT2, 400, 560, 400 * Math.SQRT2);
    const area = wettedArea(mesh, direction, at);
    at.forEach((h, row) => {
      const left = Math.max(400 * Math.SQRT2 - h, 0);
      const below = h <= 400 / Math.SQRT2;
      const ends = below ? 2 * h * h : 2 * (400 * 400 - left * left);
      const sides = below ? 2 * 700 * h * Math.SQRT2 : 700 * (4 * 400 - 2 * left * Math.SQRT2);
      expect(area[row]! / (ends + sides)).toBeCloseTo(1, 12);
    });
  });

  it('of a tetrahedron on its corner grows as the square of the depth', () => {
    const mesh = cornerTetrahedron(300, 400, 500);
    const area = wettedArea(mesh, unit([1, 1, 1]), Float64Array.of(10, 100, 170, 1000));
    // three right triangles with legs h·√3
    [10, 100, 170].forEach((h, row) => expect(area[row]! / (4.5 * h * h)).toBeCloseTo(1, 12));
    const slant = Math.hypot(300 * 400, 400 * 500, 500 * 300);
    expect(area[3]).toBeCloseTo((300 * 400 + 400 * 500 + 500 * 300 + slant) / 2, 6);
  });

  it('of a lying cylinder: the arc times its length and two segments, converging as facets⁻²', () => {
    const [r, length, h] = [300, 900, 170];
    const half = Math.acos((r - h) / r);
    const exact =
      2 * r * half * length + 2 * (r * r * half - (r - h) * Math.sqrt(2 * r * h - h * h));
    const error = (facets: number) => {
      const mesh = meshFrom([cylinderShape(r, length, facets, { axis: 'x' })]);
      return Math.abs(wettedArea(mesh, up, Float64Array.of(h, 599))[0]! / exact - 1);
    };
    expect(error(64)).toBeLessThan(2e-3);
    expect(error(512)).toBeLessThan(1e-4);
  });

  it('counts a level face inside from its own level on, seen from above as from below', () => {
    // an arch of 200 × 500 × 100 on the floor takes its foot off the floor and adds its sides and its top
    const mesh = meshFrom([boxShape([900, 500, 300])], [boxShape([200, 500, 100], [300, 0, 0])]);
    const [below, on, brim] = wettedArea(mesh, up, Float64Array.of(99.999, 100, 300));
    const floor = 700 * 500;
    // the arch runs across: its two ends are openings in the long walls
    const walls = (h: number) => 2 * (900 + 500) * h - 2 * 200 * Math.min(h, 100);
    expect(below).toBeCloseTo(floor + walls(99.999) + 2 * 500 * 99.999, 4);
    expect(on).toBeCloseTo(floor + walls(100) + 2 * 500 * 100 + 200 * 500, 4);
    expect(brim).toBeCloseTo(floor + walls(300) + 2 * 500 * 100 + 200 * 500, 4);
  });

  it('is the same row by row and carried, never falls, and with what stands above makes the whole', () => {
    const mesh = meshFrom(
      [
        cylinderShape(300, 900, 32, { axis: 'x' }),
        boxShape([400, 200, 500], [100, 50, 200], [10, 20, 30]),
      ],
      [boxShape([100, 100, 400], [300, 250, 100])],
    );
    const direction = upVector(17, -23);
    const z = levels(mesh, direction);
    const [low, high] = [Math.min(...z), Math.max(...z)];
    const many = wettedArea(mesh, direction, even(low, high, 2001));
    const few = wettedArea(mesh, direction, even(low, high, 11));
    const whole = many[2000]!;
    for (let row = 0; row < 11; row += 1) {
      expect(Math.abs(many[row * 200]! - few[row]!) / whole).toBeLessThan(1e-12);
    }
    const down = wettedArea(
      mesh,
      [-direction[0], -direction[1], -direction[2]],
      even(-high, -low, 11),
    );
    for (let row = 0; row < 11; row += 1) {
      expect(Math.abs(few[row]! + down[10 - row]! - whole) / whole).toBeLessThan(1e-9);
    }
    for (let row = 1; row < 2001; row += 1) {
      expect(many[row]! - many[row - 1]!).toBeGreaterThan(-1e-12 * whole);
    }
  });
});
