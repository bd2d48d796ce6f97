import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { distinctRounded } from '~/geometry/distinct-rounded';
import { bytesOfMesh, meshOfBytes } from '~/geometry/mesh-import/mesh-bytes';
import { meshLines } from '~/geometry/mesh-lines';
import { unit, type Vec3 } from '~/geometry/vec3';
import { boxMesh, fineBall, together, turnedOver } from './mesh-import/mesh-files';

const stretches = (crossings: { level: number; into: number }[]) =>
  crossings.map(({ level, into }) => [level, into]);

describe('lines through a mesh', () => {
  const hollow = together(boxMesh([10, 20, 30]), turnedOver(boxMesh([4, 4, 4], [3, 3, 3])));

  it('meet a hollow box where its faces are', () => {
    const up = meshLines(hollow, [0, 0, 1]);
    expect(stretches(up.crossings([5, 4.5, -99]))).toEqual([
      [0, 1],
      [3, -1],
      [7, 1],
      [30, -1],
    ]);
    expect(stretches(up.crossings([1, 1, 0]))).toEqual([
      [0, 1],
      [30, -1],
    ]);
    expect(up.crossings([11, 1, 0])).toEqual([]);
    expect(stretches(meshLines(hollow, [-1, 0, 0]).crossings([0, 1, 1]))).toEqual([
      [-10, 1],
      [0, -1],
    ]);
  });

  it('count every face once where they run through corners and edges, or along faces', () => {
    const grid = [0, 1, 2, 3, 5, 7, 10].flatMap((x) =>
      [0, 3, 5, 7, 10, 20].map((y) => [x, y, 0] as const),
    );
    for (const direction of [
      [0, 0, 1],
      [0, 0, -1],
    ] as const) {
      const lines = meshLines(hollow, direction);
      for (const point of grid) {
        const crossings = lines.crossings(point);
        expect([0, 2, 4]).toContain(crossings.length);
        let winding = 0;
        for (const { into } of crossings) {
          winding += into;
          expect([0, 1]).toContain(winding);
        }
        expect(winding).toBe(0);
      }
    }
  });

  it('add up to 0 in and out, whatever the direction: through every corner of a ball', () => {
    const ball = fineBall(12);
    const part = fc.double({ min: -1, max: 1, noNaN: true });
    const direction = fc
      .tuple(part, part, part)
      .filter((d) => Math.hypot(...d) > 0.1)
      .map(unit);
    fc.assert(
      fc.property(direction, (d) => {
        const lines = meshLines(ball, d);
        for (let i = 0; i < ball.positions.length; i += 3) {
          const corner = [...ball.positions.slice(i, i + 3)] as unknown as Vec3;
          const crossings = lines.crossings(corner);
          expect(crossings.reduce((sum, { into }) => sum + into, 0)).toBe(0);
        }
      }),
      { numRuns: 50, seed: 3 },
    );
  });
});

it('a mesh is the same after it was bytes, which are refused when they are not whole', () => {
  const ball = fineBall(5);
  const bytes = bytesOfMesh(ball);
  expect(meshOfBytes(bytes)).toEqual(ball);
  expect(bytesOfMesh(meshOfBytes(bytes))).toEqual(bytes);
  for (const length of [0, 8, 16, bytes.length - 1]) {
    expect(() => meshOfBytes(bytes.slice(0, length))).toThrow('no whole mesh');
  }
  const beyond = bytes.slice();
  beyond.fill(255, bytes.length - 4);
  expect(() => meshOfBytes(beyond)).toThrow('no whole mesh');
});

it('a crowd of vertices that round to one place are set apart, each with its way back', () => {
  const count = 100_000;
  const positions = Float64Array.from({ length: 3 * count }, (_, i) => 1000 + i * 1e-12);
  const { rounded, vertexAt } = distinctRounded(positions);
  for (let vertex = 0; vertex < count; vertex += 1) {
    expect(vertexAt(rounded[3 * vertex]!, rounded[3 * vertex + 1]!, rounded[3 * vertex + 2]!)).toBe(
      vertex,
    );
  }
  expect(() => vertexAt(1, 2, 3)).toThrow('moved a vertex');
});
