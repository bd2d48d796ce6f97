import { describe, expect, it } from 'vitest';
import { elevation } from '~/domain/report/elevation';
import { sketchOf } from '~/domain/report/sketch';
import { circle, frameOf, prismMesh } from './sample-charts';

const box = prismMesh(
  [
    [0, 0],
    [900, 0],
    [900, 300],
    [0, 300],
  ],
  500,
  'y',
);
const sloped = prismMesh(
  [
    [0, 0],
    [100, 0],
    [900, 60],
    [900, 300],
    [0, 300],
  ],
  500,
  'y',
);

const length = ({ x1, y1, x2, y2 }: { x1: number; y1: number; x2: number; y2: number }): number =>
  Math.hypot(x2 - x1, y2 - y1);

describe('elevation', () => {
  it('a box is four lines, none hidden', () => {
    const { lines, minX, maxX, minY, maxY, filled, nearest } = elevation(box, 'side');
    expect(lines).toHaveLength(4);
    expect(lines.every(({ hidden }) => !hidden)).toBe(true);
    expect([minX, maxX, minY, maxY]).toEqual([0, 900, 0, 300]);
    expect(filled).toBe(1);
    expect(nearest).toBe(0);
  });

  it('a box from the end is as wide as it is broad, seen from its +x end', () => {
    const { lines, maxX, nearest } = elevation(box, 'end');
    expect(lines).toHaveLength(4);
    expect(maxX).toBe(500);
    expect(nearest).toBe(900);
  });

  it('a sloped floor shows its slope', () => {
    const { lines, filled } = elevation(sloped, 'side');
    expect(lines.some((line) => Math.abs(length(line) - Math.hypot(800, 60)) < 1e-6)).toBe(true);
    // 1 − ½·800·60 / (900·300)
    expect(filled).toBeCloseTo(0.911, 2);
  });

  it('a cylinder from its end is a circle, from its side a rectangle', () => {
    const barrel = prismMesh(circle(160, 48), 800, 'x');
    expect(elevation(barrel, 'end').lines).toHaveLength(48);
    expect(elevation(barrel, 'end').filled).toBeCloseTo(Math.PI / 4, 1);
    const side = elevation(barrel, 'side').lines.filter((line) => !line.hidden);
    const outline = side.filter(
      ({ y1, y2 }) => Math.abs(y1 - y2) < 1e-6 && Math.abs(y1 - 160) > 150,
    );
    expect(outline.map(length)).toEqual([800, 800]);
  });

  it('what stands behind is hidden', () => {
    // two boxes, the far one lower and half covered
    const near = prismMesh(
      [
        [0, 0],
        [500, 0],
        [500, 300],
        [0, 300],
      ],
      100,
      'y',
    );
    const far = prismMesh(
      [
        [100, 50],
        [400, 50],
        [400, 200],
        [100, 200],
      ],
      100,
      'y',
    );
    const moved = Float64Array.from(far.positions, (value, index) =>
      index % 3 === 1 ? value + 300 : value,
    );
    const both = {
      positions: Float64Array.from([...near.positions, ...moved]),
      triangles: Uint32Array.from([
        ...near.triangles,
        ...far.triangles.map((v) => v + near.positions.length / 3),
      ]),
    };
    const { lines } = elevation(both, 'side');
    expect(lines.filter(({ hidden }) => hidden)).toHaveLength(4);
    expect(lines.filter(({ hidden }) => !hidden)).toHaveLength(4);
  });
});

describe('sketchOf', () => {
  it('takes the view that says more', () => {
    expect(sketchOf(sloped, frameOf(300, [50, 250])).view).toBe('side');
    expect(sketchOf(prismMesh(circle(160, 48), 800, 'x'), frameOf(320, [400, 160])).view).toBe(
      'end',
    );
    expect(sketchOf(box, frameOf(300, [50, 250])).view).toBe('side');
  });

  it('places stick and dip point', () => {
    const { stick, dipPoint } = sketchOf(sloped, frameOf(300, [50, 250]));
    expect(stick).toEqual({ x: 50, zeroY: 0, roofY: 300 });
    expect(dipPoint).toEqual({ fromLeftMm: 50, fromNearMm: 250, zeroAboveLowestMm: 0 });
  });
});
