import { describe, expect, it } from 'vitest';
import { arcChords, areaPreservingArc } from '~/geometry/area-preserving-arc';
import { lineInOutline } from '~/geometry/line-in-outline';
import { outlineArea, polygonArea } from '~/geometry/outline-area';
import { crossingSides } from '~/geometry/outline-crossing';
import { outlinePolygon } from '~/geometry/outline-polygon';
import { outlineSupport } from '~/geometry/outline-support';
import { cornerArcs, type RoundedOutline } from '~/geometry/rounded-outline';
import type { Vec2 } from '~/geometry/shape';
import { swollen } from '~/geometry/swollen';

/** Corners that stand out and go in, arcs that meet on a side, a sharp one. */
const outline: RoundedOutline = {
  corners: [
    [0, 0],
    [600, 0],
    [600, 400],
    [300, 200],
    [0, 400],
  ],
  radii: [200, 150, 40, 90, 0],
};

describe('areaPreservingArc', () => {
  it.each([
    [1, 0.3],
    [1, Math.PI / 8],
    [2, Math.PI / 4],
    [16, Math.PI / 2],
    [128, Math.PI / 2],
    [200, 3],
  ])('%s chords over %s rad enclose the sector, and end on its tangents', (chords, angle) => {
    const points = areaPreservingArc(chords, angle);
    expect(points).toHaveLength(chords + 1);
    // the sector's two radii, the tangents as far as the chords leave of them
    const sector = polygonArea([[0, 0], [1, 0], ...points, [Math.cos(angle), Math.sin(angle)]]);
    expect(sector / (angle / 2)).toBeCloseTo(1, 13);
    expect(points[0]![0]).toBe(1);
    const [x, y] = points.at(-1)!;
    expect(x * Math.cos(angle) + y * Math.sin(angle)).toBeCloseTo(1, 14);
    // the ends lie inside the arc's span, so arcs that meet do not cross
    expect(points[0]![1]).toBeGreaterThan(0);
    expect(points[0]![1]).toBeLessThan(angle / chords / 2);
  });

  it('stands off as the square of the step: at most δ²/12 outside', () => {
    const step = Math.PI / 2 / 64;
    const farthest = Math.max(
      ...areaPreservingArc(64, Math.PI / 2).map(([x, y]) => Math.hypot(x, y) - 1),
    );
    expect(farthest / (step ** 2 / 12)).toBeCloseTo(1, 2);
  });
});

describe('arcChords', () => {
  it('doubles with the facets and goes with the angle', () => {
    expect(arcChords(100, Math.PI / 2, 256)).toBe(64);
    expect(arcChords(100, 0.1, 256)).toBe(16);
    for (const angle of [0.1, 1, Math.PI / 2, 3]) {
      expect(arcChords(100, angle, 256)).toBe(2 * arcChords(100, angle, 128));
    }
  });

  it('is capped where chords would be shorter than a thousandth of a millimetre', () => {
    expect(arcChords(0.01, Math.PI / 2, 512)).toBe(15);
  });
});

describe('a rounded outline', () => {
  it('has a polygon of its exact area at any facets, which does not cross itself', () => {
    for (const facets of [16, 48, 256]) {
      const { points, straight } = outlinePolygon(outline, facets);
      expect(polygonArea(points) / outlineArea(outline)).toBeCloseTo(1, 13);
      expect(crossingSides(points)).toBeNull();
      expect(straight).toHaveLength(points.length);
      expect(straight.filter(Boolean)).toHaveLength(5);
    }
  });

  it('has a chord for a side that two arcs leave nothing of', () => {
    const corners: Vec2[] = [
      [0, 0],
      [400, 0],
      [400, 200],
      [0, 200],
    ];
    const stadium = { corners, radii: [100, 100, 100, 100] };
    const { straight } = outlinePolygon(stadium, 64);
    expect(straight.filter(Boolean)).toHaveLength(2);
  });

  it('reaches as far as its polygon does, within what facets stand off', () => {
    const { points } = outlinePolygon(outline, 512);
    for (let k = 0; k < 72; k += 1) {
      const u: Vec2 = [Math.cos((k * Math.PI) / 36), Math.sin((k * Math.PI) / 36)];
      const reach = Math.max(...points.map(([x, y]) => u[0] * x + u[1] * y));
      expect(Math.abs(outlineSupport(outline, u) - reach)).toBeLessThan(0.01);
    }
  });

  it('is met by a line where arcs and sides say', () => {
    const parts = { corners: outline.corners, arcs: cornerArcs(outline) };
    // through the middles of the two rounded lower corners: x = 200 − √(200² − 100²), 450 + √(150² − 50²)
    const [low] = lineInOutline(parts, [0, 100], [1, 0], 0);
    expect(low!.from).toBeCloseTo(200 - Math.sqrt(200 ** 2 - 100 ** 2), 9);
    expect(low!.to).toBeCloseTo(450 + Math.sqrt(150 ** 2 - 50 ** 2), 9);
    // over the notch there are two stretches
    expect(lineInOutline(parts, [0, 300], [1, 0], 0)).toHaveLength(2);
    // along the upright side at x = 600, from the end of one arc to the beginning of the next
    const [side] = lineInOutline(parts, [600, 0], [0, 1], 2e-6);
    expect(side!.from).toBeCloseTo(150, 2);
    expect(lineInOutline(parts, [600, 0], [0, 1], -2e-6)).toEqual([]);
    expect(lineInOutline(parts, [600.001, 0], [0, 1], 2e-6)).toEqual([]);
  });

  it('lines add up to its area', () => {
    const parts = { corners: outline.corners, arcs: cornerArcs(outline) };
    const n = 4000;
    let sum = 0;
    for (let i = 0; i < n; i += 1) {
      const x = (600 * (i + 0.5)) / n;
      for (const { from, to } of lineInOutline(parts, [x, -7], [0.3, 1], 0)) sum += to - from;
      for (const { from, to } of lineInOutline(parts, [x - 600, -7], [0.3, 1], 0)) sum += to - from;
    }
    expect((sum * 600) / n / outlineArea(outline)).toBeCloseTo(1, 4);
  });
});

describe('crossingSides', () => {
  it('finds a crossing, a touch and a side that runs back', () => {
    const square: Vec2[] = [
      [0, 0],
      [10, 0],
      [10, 10],
      [0, 10],
    ];
    expect(crossingSides(square)).toBeNull();
    expect(crossingSides([square[0]!, square[2]!, square[1]!, square[3]!])).toEqual([0, 2]);
    expect(crossingSides([...square.slice(0, 3), [5, 1e-7], [0, 10]])).toEqual([0, 2]);
    expect(crossingSides([...square.slice(0, 3), [5, 1e-3], [0, 10]])).toBeNull();
    expect(
      crossingSides([
        [0, 0],
        [10, 0],
        [5, 0],
        [5, 5],
      ]),
    ).toEqual([0, 1]);
  });
});

describe('swollen', () => {
  it('moves chords and leaves flat sides where they are', () => {
    const { points, straight } = outlinePolygon(outline, 64);
    const shape = {
      form: 'extrusion',
      axis: 'z',
      outline: points,
      length: 10,
      flat: straight,
    } as const;
    const grown = swollen(shape, 0.5);
    if (grown.form !== 'extrusion') throw new Error('another form');
    grown.outline.forEach(([x, y], i) => {
      const [px, py] = points[i]!;
      const flat = straight[i]! || straight[(i + points.length - 1) % points.length]!;
      expect(Math.hypot(x - px, y - py)).toBeCloseTo(flat ? 0 : 0.5, 12);
    });
    expect(polygonArea(grown.outline)).toBeGreaterThan(polygonArea(points));
  });
});
