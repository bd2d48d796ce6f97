import { describe, expect, it } from 'vitest';
import { shells } from '~/geometry/shells';
import { thinPlace } from '~/geometry/thin-places';
import type { Vec3 } from '~/geometry/vec3';
import { boxShape, cylinderShape, meshFrom } from './solids';

describe('thinPlace', () => {
  const body = boxShape([900, 500, 300]);

  it('finds nothing wrong with solids that meet, overlap or taper', () => {
    expect(thinPlace(meshFrom([body, boxShape([100, 100, 100], [900, 0, 0])]), 0.01)).toBeNull();
    expect(thinPlace(meshFrom([body], [boxShape([100, 100, 299.9], [0, 0, 0])]), 0.01)).toBeNull();
    expect(thinPlace(meshFrom([cylinderShape(200, 600, 64)]), 0.01)).toBeNull();
  });

  it('finds a film of liquid between what displaces and a wall', () => {
    const place = thinPlace(meshFrom([body], [boxShape([100, 100, 299.996], [400, 200, 0])]), 0.01);
    expect(place?.what).toBe('film');
    expect(place?.gapMm).toBeCloseTo(0.004, 6);
    expect(place?.at[2]).toBeGreaterThan(299.9);
  });

  it.each([1e-6, 1e-4, 0.009])('finds a wall of %s mm between two chambers', (gap) => {
    const mesh = meshFrom([body, boxShape([100, 100, 100], [900 + gap, 0, 0])]);
    expect(shells(mesh)).toHaveLength(2);
    expect(thinPlace(mesh, 0.01)?.what).toBe('wall');
  });

  it('finds it between turned solids, and where round ones nest', () => {
    const turn: Vec3 = [0, 0, 30];
    // beside it along its own x, which points 30° off x
    const c = Math.cos(Math.PI / 6);
    const s = Math.sin(Math.PI / 6);
    const step = 100.005;
    const mesh = meshFrom([
      boxShape([100, 100, 100], [0, 0, 0], turn),
      boxShape([100, 100, 100], [step * c, step * s, 0], turn),
    ]);
    expect(thinPlace(mesh, 0.01)?.what).toBe('wall');
    const nested = meshFrom(
      [cylinderShape(200, 600, 64)],
      [cylinderShape(199.995, 500, 64, { at: [0.005, 0.005, 0] })],
    );
    expect(thinPlace(nested, 0.01)?.what).toBe('film');
  });

  it('leaves walls and films that can be built alone', () => {
    expect(thinPlace(meshFrom([body, boxShape([100, 100, 100], [900.02, 0, 0])]), 0.01)).toBeNull();
  });
});
