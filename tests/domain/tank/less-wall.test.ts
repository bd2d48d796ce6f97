import { describe, expect, it } from 'vitest';
import type { Solid } from '~/domain/tank/kinds/registry';
import { lessWall } from '~/domain/tank/less-wall';
import { placedSolid } from '~/domain/tank/placed-solid';
import { loadManifold } from '~/geometry/manifold';

await loadManifold();

const ellipsoid = (length: number, width: number, height: number, rest: Partial<Solid> = {}) =>
  ({ id: 'e', role: 'holds', kind: 'ellipsoid', length, width, height, ...rest }) as Solid;

describe('a wall of more than half the least size leaves nothing, and is told at once', () => {
  it.each<[string, Solid, number]>([
    ['a needle of 100 m', ellipsoid(106, 525, 100_000), 60],
    ['a leaf of 0.05 mm, turned', ellipsoid(700, 235, 0.05, { turn: [-74, 70, -58] }), 100_000],
    [
      'an elliptical tank',
      { id: 'o', role: 'holds', kind: 'oval', length: 100_000, width: 900, height: 119 },
      60,
    ],
  ])('%s', (_, solid, wallMm) => {
    const before = process.cpuUsage();
    expect(lessWall(placedSolid(solid), wallMm)).toBeNull();
    const { user, system } = process.cpuUsage(before);
    expect((user + system) / 1000).toBeLessThan(500);
  });

  it('a thinner one leaves something', () => {
    expect(lessWall(placedSolid(ellipsoid(300, 400, 500)), 140)).not.toBeNull();
  });
});
