import { describe, expect, it } from 'vitest';
import { upVector } from '~/geometry/attitude';
import type { Mesh } from '~/geometry/mesh';
import { joiningPools, restingPools } from '~/geometry/pools';
import type { Vec3 } from '~/geometry/vec3';
import { boxShape, meshFrom } from './solids';

const up: Vec3 = [0, 0, 1];
const down: Vec3 = [0, 0, -1];

const restingVolume = (mesh: Mesh, up: Vec3, point: Vec3, nearMm: number) =>
  restingPools(mesh, up, point, nearMm).reduce((sum, { volumeMm3 }) => sum + volumeMm3, 0);

describe('restingPools', () => {
  // 1000 × 400 × 300 with a sill 100 high and 200 wide: a sump of 300 on one side, of 500 on the other
  const sumps = meshFrom([boxShape([1000, 400, 300])], [boxShape([200, 400, 100], [300, 0, 0])]);

  it('leaves what is below the outlet, and the pool behind the sill', () => {
    // outlet 20 mm up in the small sump: 300·400·20 there, 500·400·100 in the other
    expect(restingVolume(sumps, up, [100, 200, 20], 0.01)).toBeCloseTo(2_400_000 + 20_000_000, 3);
    // on the floor of the large one
    expect(restingVolume(sumps, up, [900, 200, 0], 0.01)).toBeCloseTo(300 * 400 * 100, 3);
  });

  it('leaves all that is below an outlet above the sill', () => {
    expect(restingVolume(sumps, up, [100, 200, 150], 0.01)).toBeCloseTo(
      800 * 400 * 100 + 1000 * 400 * 50,
      3,
    );
  });

  it('takes a point on a wall, an edge or a corner', () => {
    expect(restingVolume(sumps, up, [0, 200, 20], 0.01)).toBeCloseTo(22_400_000, 3);
    expect(restingVolume(sumps, up, [0, 0, 0], 0.01)).toBeCloseTo(20_000_000, 3);
  });

  it('fills a pool of two hollows to the sill that parts both from the outlet', () => {
    // sills of 80 and 120: hollows 200, 300 and 300 long; the outlet in the last
    const three = meshFrom(
      [boxShape([1000, 100, 300])],
      [boxShape([100, 100, 80], [200, 0, 0]), boxShape([100, 100, 120], [600, 0, 0])],
    );
    const behind = 600 * 100 * 120 - 100 * 100 * 80;
    expect(restingVolume(three, up, [900, 50, 0], 0.01)).toBeCloseTo(behind, 3);
    // outlet in the middle one: the first keeps its 80, the last its 120
    expect(restingVolume(three, up, [450, 50, 0], 0.01)).toBeCloseTo(
      200 * 100 * 80 + 300 * 100 * 120,
      3,
    );
  });

  it('does not take the underside of what hangs in the tank for a pool', () => {
    const hanging = meshFrom(
      [boxShape([1000, 400, 300])],
      [boxShape([200, 200, 100], [400, 100, 150])],
    );
    expect(restingVolume(hanging, up, [100, 200, 0], 0.01)).toBeCloseTo(0, 6);
    expect(restingVolume(hanging, up, [500, 200, 140], 0.01)).toBeCloseTo(1000 * 400 * 140, 3);
    // hung from the roof it parts the air: the part without the vent is trapped
    const baffle = meshFrom(
      [boxShape([1000, 400, 300])],
      [boxShape([100, 400, 120], [400, 0, 180])],
    );
    expect(restingVolume(baffle, down, [100, 200, 300], 0.01)).toBeCloseTo(500 * 400 * 120, 3);
  });

  it('counts a chamber that never meets the outlet as a whole', () => {
    const two = meshFrom([boxShape([100, 100, 100]), boxShape([100, 100, 50], [300, 0, 0])]);
    expect(restingVolume(two, up, [50, 50, 0], 0.01)).toBeCloseTo(500_000, 6);
  });

  it('sees a hollow shell, and what stands on an island in it', () => {
    const shell = meshFrom(
      [boxShape([300, 300, 300])],
      [boxShape([100, 100, 100], [100, 100, 100])],
    );
    expect(restingVolume(shell, up, [10, 10, 0], 0.01)).toBeCloseTo(0, 6);
    expect(restingVolume(shell, up, [10, 10, 300], 0.01)).toBeCloseTo(27e6 - 1e6, 3);
  });

  it('drains a tilted box to the prism that its corner outlet cannot reach', () => {
    // lower at +x by 10°, outlet on the floor at the upper end: a triangle over the lower end stays
    const mesh = meshFrom([boxShape([1000, 400, 300])]);
    const direction = upVector(10, 0);
    const slope = Math.tan(Math.PI / 18);
    expect(restingVolume(mesh, direction, [0, 200, 0], 0.01)).toBeCloseTo(
      0.5 * 1000 * 1000 * slope * 400,
      2,
    );
    // at the lower end nothing stays
    expect(restingVolume(mesh, direction, [1000, 200, 0], 0.01)).toBeCloseTo(0, 2);
    // vent at the lower end of the roof: the air at the upper end is trapped
    const trapped = restingVolume(
      mesh,
      [-direction[0], -direction[1], -direction[2]],
      [1000, 200, 300],
      0.01,
    );
    expect(trapped).toBeCloseTo(0.5 * 1000 * 1000 * slope * 400, 2);
  });

  it('keeps the corner tetrahedron of a box tilted two ways', () => {
    const mesh = meshFrom([boxShape([1000, 1000, 1000])]);
    const direction = upVector(20, 30);
    // lowest corner x = y = 1000, z = 0; outlet 100 mm along x from it
    const u = [Math.abs(direction[0]), Math.abs(direction[1]), direction[2]] as const;
    const h = 100 * u[0];
    const left = ((h / u[0]) * (h / u[1]) * (h / u[2])) / 6;
    expect(restingVolume(mesh, direction, [900, 1000, 0], 0.01)).toBeCloseTo(left, 3);
  });
});

describe('joiningPools', () => {
  it('tells where hollows become one, with what each then holds', () => {
    const three = meshFrom(
      [boxShape([1000, 100, 300])],
      [boxShape([100, 100, 80], [200, 0, 0]), boxShape([100, 100, 120], [600, 0, 0])],
    );
    const joins = joiningPools(three, up);
    expect(joins.map(({ levelMm }) => levelMm)).toEqual([80, 120]);
    const volumes = joins.map(({ pools }) =>
      pools.map(({ volumeMm3 }) => volumeMm3).sort((one, other) => one - other),
    );
    expect(volumes[0]![0]).toBeCloseTo(200 * 100 * 80, 6);
    expect(volumes[0]![1]).toBeCloseTo(300 * 100 * 80, 6);
    expect(volumes[1]![0]).toBeCloseTo(300 * 100 * 120, 6);
    expect(volumes[1]![1]).toBeCloseTo(600 * 100 * 120 - 100 * 100 * 80, 6);
  });

  it('knows one hollow where there is one, whatever hangs or stands in it', () => {
    expect(joiningPools(meshFrom([boxShape([10, 20, 30])]), upVector(12, -7))).toEqual([]);
    const island = meshFrom(
      [boxShape([300, 300, 300])],
      [boxShape([100, 100, 100], [100, 100, 0])],
    );
    expect(joiningPools(island, up)).toEqual([]);
    const hanging = meshFrom(
      [boxShape([300, 300, 300])],
      [boxShape([100, 100, 100], [100, 100, 100])],
    );
    expect(joiningPools(hanging, upVector(3, 4))).toEqual([]);
  });
});
