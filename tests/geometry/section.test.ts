import { describe, expect, it } from 'vitest';
import { sectionLoops, sectionSegments } from '~/geometry/section';
import { boxShape, meshFrom } from './solids';

describe('sectionLoops', () => {
  const ring = meshFrom([boxShape([100, 100, 50])], [boxShape([40, 40, 50], [30, 30, 0])]);

  it('gives one loop round the liquid and one, the other way, round an island', () => {
    const loops = sectionLoops(ring, [0, 0, 1], 20);
    const areas = loops.map(areaXY).sort((one, other) => one - other);
    expect(areas).toHaveLength(2);
    expect(areas[0]).toBeCloseTo(-1600, 9);
    expect(areas[1]).toBeCloseTo(10_000, 9);
    for (const loop of loops)
      for (let i = 2; i < loop.length; i += 3) expect(loop[i]).toBeCloseTo(20, 12);
  });

  it('gives nothing above the roof and below the floor, and the floor at the floor', () => {
    expect(sectionLoops(ring, [0, 0, 1], 50.001)).toEqual([]);
    expect(sectionLoops(ring, [0, 0, 1], -0.001)).toEqual([]);
    expect(sectionLoops(ring, [0, 0, 1], 0)).toEqual([]);
  });

  it('gives the same outline as segments, each starting where the last ended', () => {
    const segments = sectionSegments(meshFrom([boxShape([100, 60, 50])]), [0, 0, 1], 20);
    expect(segments.length % 6).toBe(0);
    for (let i = 6; i < segments.length; i += 6) {
      expect([...segments.subarray(i, i + 3)]).toEqual([...segments.subarray(i - 3, i)]);
    }
  });
});

function areaXY(loop: Float64Array): number {
  let twice = 0;
  for (let i = 0; i < loop.length; i += 3) {
    const j = (i + 3) % loop.length;
    twice += loop[i]! * loop[j + 1]! - loop[j]! * loop[i + 1]!;
  }
  return twice / 2;
}
