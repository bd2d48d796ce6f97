import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ReadingFrame, TankMesh } from '~/domain/table/preview';
import { apply, onPlate, plumbMatrix, project, viewMatrix, type View } from '~/viewport/projection';

/** A unit-cube mesh scaled to a box, mm; only its corners matter here. */
function boxMesh(x: number, y: number, z: number): TankMesh {
  const corners = [0, 1, 2, 3, 4, 5, 6, 7].flatMap((bits) => [
    bits & 1 ? x : 0,
    bits & 2 ? y : 0,
    bits & 4 ? z : 0,
  ]);
  return {
    positions: Float64Array.from(corners),
    triangles: new Uint32Array(),
  };
}

const plate = {
  width: 800,
  height: 560,
  railTop: 84,
  railPx: 410,
  marginX: 120,
};
const frame: ReadingFrame = {
  up: [0, 0, 1],
  zeroLevelMm: 0,
  levelPerReading: 1,
  heightMm: 300,
  stick: null,
  lowestLevelMm: 0,
  highestLevelMm: 300,
};
const upright: View[] = [{ name: 'end' }, { name: 'side' }, { name: 'away' }];

describe('projection of the tank onto the plate', () => {
  it.each(upright)('stands at the stick’s own scale: $name', (view) => {
    const projection = project(boxMesh(900, 500, 300), frame, view, plate);
    const front = view.name === 'end' ? [900, 0] : [0, 0];
    const low = onPlate(projection, [front[0]!, front[1]!, 0]);
    const high = onPlate(projection, [front[0]!, front[1]!, 300]);
    expect(low[1]).toBeCloseTo(plate.railTop + plate.railPx, 9);
    expect(high[1]).toBeCloseTo(plate.railTop, 9);
  });

  it.each(upright)('keeps everything inside the plate, however long: $name', (view) => {
    const projection = project(boxMesh(6000, 2500, 300), frame, view, plate);
    for (const x of [0, 6000])
      for (const y of [0, 2500])
        for (const z of [0, 300]) {
          const [px, py] = onPlate(projection, [x, y, z]);
          expect(px).toBeGreaterThan(0);
          expect(px).toBeLessThan(plate.width);
          expect(py).toBeGreaterThan(0);
          expect(py).toBeLessThan(plate.height);
        }
  });

  it('says when lengths are drawn shorter than heights', () => {
    expect(project(boxMesh(6000, 500, 300), frame, { name: 'side' }, plate).shortened).toBe(true);
    expect(project(boxMesh(300, 300, 300), frame, { name: 'side' }, plate).shortened).toBe(false);
  });

  it('turns any up to plumb without stretching', () => {
    const slope = fc.double({ min: -1, max: 1, noNaN: true });
    fc.assert(
      fc.property(slope, slope, (a, b) => {
        const size = Math.hypot(a, b, 1);
        const m = plumbMatrix([a / size, b / size, 1 / size]);
        const [x, y, z] = apply(m, [a / size, b / size, 1 / size]);
        expect(Math.hypot(x, y, z - 1)).toBeLessThan(1e-12);
        const across = apply(m, [1, 0, 0]);
        expect(Math.hypot(...across)).toBeCloseTo(1, 12);
      }),
    );
  });

  it('turned freely looks from where the eye is: level, it is the side view', () => {
    const free = viewMatrix({ name: 'free', azimuth: 0, elevation: 0 }, 0);
    const side = viewMatrix({ name: 'side' }, 0);
    free.forEach((row, r) =>
      row.forEach((value, c) => expect(value).toBeCloseTo(side[r]![c]!, 12)),
    );
  });
});
