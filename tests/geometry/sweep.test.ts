import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { upVector } from '~/geometry/attitude';
import { enclosedVolume, levels, type Mesh } from '~/geometry/mesh';
import { sectionLoops } from '~/geometry/section';
import { sweep } from '~/geometry/sweep';
import { cross, dot, unit, type Vec3 } from '~/geometry/vec3';
import { boxShape, cornerTetrahedron, cylinderShape, meshFrom } from './solids';

const up: Vec3 = [0, 0, 1];

function even(low: number, high: number, count: number): Float64Array {
  return Float64Array.from({ length: count }, (_, i) => low + ((high - low) * i) / (count - 1));
}

function ends(mesh: Mesh, direction: Vec3): readonly [number, number] {
  const z = levels(mesh, direction);
  return [Math.min(...z), Math.max(...z)];
}

describe('sweep', () => {
  it('is exact on a box: volume, surface and centroid', () => {
    const mesh = meshFrom([boxShape([900, 500, 300])]);
    const { volume, surface, moments } = sweep(mesh, up, Float64Array.of(0, 75, 300));
    expect([...volume]).toEqual([0, 900 * 500 * 75, 900 * 500 * 300]);
    // from above at the floor, from below at the brim
    expect([...surface]).toEqual([450_000, 450_000, 450_000]);
    expect(moments[0][1]! / volume[1]!).toBeCloseTo(450, 9);
    expect(moments[1][1]! / volume[1]!).toBeCloseTo(250, 9);
    expect(moments[2][1]! / volume[1]!).toBeCloseTo(37.5, 9);
  });

  it('follows the cubic of a tetrahedron that stands on its corner', () => {
    const mesh = cornerTetrahedron(300, 400, 500);
    const direction = unit([1, 1, 1]);
    // below the nearest corner (level 300/√3) the wet part is a corner tetrahedron with edges h√3
    const { volume, surface, moments } = sweep(
      mesh,
      direction,
      Float64Array.of(10, 100, 170, 1000),
    );
    [10, 100, 170].forEach((h, row) => {
      const edge = h * Math.sqrt(3);
      expect(volume[row]).toBeCloseTo(edge ** 3 / 6, 5);
      expect(surface[row]! / ((Math.sqrt(3) / 2) * edge ** 2)).toBeCloseTo(1, 12);
      for (const moment of moments) expect(moment[row]! / volume[row]!).toBeCloseTo(edge / 4, 9);
    });
    expect(volume[3]).toBeCloseTo((300 * 400 * 500) / 6, 5);
    [300, 400, 500].forEach((edge, axis) => {
      expect(moments[axis]![3]! / volume[3]!).toBeCloseTo(edge / 4, 9);
    });
  });

  it('gives the same row by row and carried from row to row', () => {
    const mesh = meshFrom(
      [
        cylinderShape(300, 900, 32, { axis: 'x' }),
        boxShape([400, 200, 500], [100, 50, 200], [10, 20, 30]),
      ],
      [boxShape([100, 100, 400], [300, 250, 100])],
    );
    const direction = upVector(17, -23);
    const [low, high] = ends(mesh, direction);
    const dense = even(low, high, 2001);
    const sparse = even(low, high, 11);
    const many = sweep(mesh, direction, dense);
    const few = sweep(mesh, direction, sparse);
    const whole = enclosedVolume(mesh);
    for (let row = 0; row < 11; row += 1) {
      expect(Math.abs(many.volume[row * 200]! - few.volume[row]!) / whole).toBeLessThan(1e-12);
      for (let axis = 0; axis < 3; axis += 1) {
        const gap = many.moments[axis]![row * 200]! - few.moments[axis]![row]!;
        expect(Math.abs(gap) / (whole * 1000)).toBeLessThan(1e-12);
      }
    }
  });

  it('agrees with the areas of sections, integrated', () => {
    const mesh = meshFrom(
      [cylinderShape(300, 900, 48, { axis: 'y' }), boxShape([700, 500, 300], [-50, 100, 250])],
      [boxShape([120, 950, 200], [200, -20, 100], [0, 15, 0])],
    );
    const direction = upVector(12, 7);
    const [low, high] = ends(mesh, direction);
    const at = low + 0.61 * (high - low);
    const steps = 4000;
    let sum = 0;
    for (let i = 0; i < steps; i += 1) {
      sum += areaOf(
        sectionLoops(mesh, direction, low + ((i + 0.5) / steps) * (at - low)),
        direction,
      );
    }
    const { volume, surface } = sweep(mesh, direction, Float64Array.of(at, high));
    expect((sum * (at - low)) / steps / volume[0]!).toBeCloseTo(1, 6);
    expect(areaOf(sectionLoops(mesh, direction, at), direction) / surface[0]!).toBeCloseTo(1, 9);
  });

  it('holds its invariants on any tilt', () => {
    const mesh = meshFrom(
      [boxShape([600, 400, 300]), cylinderShape(120, 500, 24, { axis: 'z', at: [500, 300, 100] })],
      [boxShape([200, 200, 200], [100, 100, -50])],
    );
    const whole = enclosedVolume(mesh);
    fc.assert(
      fc.property(
        fc.double({ min: -60, max: 60, noNaN: true }),
        fc.double({ min: -60, max: 60, noNaN: true }),
        fc.integer({ min: 2, max: 60 }),
        (pitch, roll, count) => {
          const direction = upVector(pitch, roll);
          const [low, high] = ends(mesh, direction);
          const at = even(low, high, count);
          const { volume, surface, moments } = sweep(mesh, direction, at);
          const down = sweep(
            mesh,
            [-direction[0], -direction[1], -direction[2]],
            at.map((h) => -h).reverse(),
          );
          for (let row = 0; row < count; row += 1) {
            if (row > 0) expect(volume[row]! - volume[row - 1]!).toBeGreaterThan(-1e-11 * whole);
            expect(surface[row]).toBeGreaterThan(-1e-9 * whole);
            // what is below and what is above make the whole; a corner within 1e-9 of a level counts as met
            expect(Math.abs(volume[row]! + down.volume[count - 1 - row]! - whole)).toBeLessThan(
              1e-9 * whole,
            );
            if (volume[row]! > 1e-6 * whole) {
              const centroid = moments.map(
                (moment) => moment[row]! / volume[row]!,
              ) as unknown as Vec3;
              expect(dot(direction, centroid)).toBeLessThan(at[row]! + 1e-6);
              expect(dot(direction, centroid)).toBeGreaterThan(low - 1e-6);
            }
          }
        },
      ),
      { numRuns: 60, seed: 20 },
    );
  });

  it.each([1e-3, 1, 1e3])('scales: the same tank × %s', (scale) => {
    const size: Vec3 = [900 * scale, 500 * scale, 300 * scale];
    const mesh = meshFrom([boxShape(size, [7 * scale, -3 * scale, 2 * scale], [0, 0, 33])]);
    const direction = upVector(8, 3);
    const [low, high] = ends(mesh, direction);
    const { volume } = sweep(mesh, direction, Float64Array.of((low + high) / 2, high));
    // a box is cut in halves by any plane through its middle
    expect(volume[0]! / (67_500_000 * scale ** 3)).toBeCloseTo(1, 9);
    expect(volume[1]! / (135_000_000 * scale ** 3)).toBeCloseTo(1, 9);
  });

  it('does not mind levels that meet corners within rounding', () => {
    const mesh = meshFrom([
      boxShape([100, 100, 100]),
      boxShape([50, 50, 100], [100, 0, 0.1 + 0.2]),
    ]);
    const { surface } = sweep(mesh, up, Float64Array.of(0.3 - 1e-13, 50, 100.3));
    expect(surface[0]).toBeCloseTo(12_500, 6);
  });
});

function areaOf(loops: readonly Float64Array[], direction: Vec3): number {
  let twice = 0;
  for (const loop of loops) {
    for (let i = 0; i < loop.length; i += 3) {
      const j = (i + 3) % loop.length;
      const a: Vec3 = [loop[i]!, loop[i + 1]!, loop[i + 2]!];
      const b: Vec3 = [loop[j]!, loop[j + 1]!, loop[j + 2]!];
      twice += dot(cross(a, b), direction);
    }
  }
  return twice / 2;
}
