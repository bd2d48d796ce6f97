import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import { liquidSpace } from '~/domain/table/liquid-space';
import { doubledFacets, publishedFacets } from '~/domain/table/published-facets';
import { readingFrame } from '~/domain/table/reading-frame';
import { tableRows } from '~/domain/table/table-rows';
import type { TankDocument } from '~/domain/tank/document';
import type { Solid } from '~/domain/tank/kinds/registry';
import { placedSolids } from '~/domain/tank/placed-solids';
import { loadManifold } from '~/geometry/manifold';
import { box, cylinder, design } from './designs';

await loadManifold();

const ball = (id: string, diameter: number, at: [number, number, number] = [0, 0, 0]) =>
  ({ id, role: 'holds', kind: 'sphere', diameter, at }) as Solid;
const torisphere = { form: 'torisphere', crown: 800, knuckle: 80 };
const vessel = { ...cylinder('vessel', 800, 1600), ends: [torisphere, torisphere] } as Solid;
const dome = {
  ...cylinder('dome', 300, 300, { axis: 'z', at: [1100, 250, 700] } as Partial<Solid>),
  ends: [{ form: 'flat' }, { form: 'ellipsoid', depth: 75 }],
} as Solid;
const lid = box('lid', [200, 200, 200], { at: [600, 300, 700] });
const vesselWithDome = design([vessel, lid, dome]);

const first = (tank: TankDocument) => publishedFacets(placedSolids(tank));

/** The greatest |V₂ₙ − Vₙ| over 101 readings as part of the capacity. */
function bound(tank: TankDocument, facets: number): number {
  const solids = placedSolids(tank);
  const [coarse, fine] = [facets / 2, facets].map((count) => liquidSpace(solids, count));
  const frame = readingFrame(tank, solids, fine!);
  const depths = Array.from({ length: 101 }, (_, i) => (i / 100) * frame.heightMm);
  const rough = tableRows(coarse!, frame, depths);
  const gaps = tableRows(fine!, frame, depths).map(({ volumeL }, i) =>
    Math.abs(volumeL - rough[i]!.volumeL),
  );
  return Math.max(...gaps) / (fine!.volumeMm3 / 1e6);
}

describe('the facets that a table is published at', () => {
  it('are finest where few triangles must be joined', () => {
    expect(first(design([cylinder('c', 500, 1000)]))).toBe(512);
    expect(first(design([vessel]))).toBe(256);
    expect(first(vesselWithDome)).toBe(128);
    const row = Array.from({ length: 20 }, (_, i) =>
      cylinder(`c${i}`, 500, 1000, { at: [i * 700, i * 40, i * 31] } as Partial<Solid>),
    );
    expect(first(design(row))).toBe(256);
    const many = Array.from({ length: 60 }, (_, i) => ball(`b${i}`, 300, [i * 200, 0, 0]));
    expect(first(design(many))).toBe(128);
    expect(doubledFacets(placedSolids(design(many)), 128)).toBeNull();
  });

  it('are doubled once more where the bound would pass 1e-6 of capacity', async () => {
    expect(bound(vesselWithDome, 128)).toBeGreaterThan(1e-6);
    const { errorL, capacityL, triangles } = await computeTable(vesselWithDome, { stepMm: 25 });
    expect(errorL / capacityL).toBeLessThan(1e-6);
    const twice = liquidSpace(placedSolids(vesselWithDome), 256);
    expect(triangles).toBe(twice.mesh.triangles.length / 3);
  });

  it('of a ball alone are doubled too: nothing has to be joined', async () => {
    const tank = design([ball('ball', 600)]);
    expect(first(tank)).toBe(256);
    expect(bound(tank, 256)).toBeGreaterThan(1e-6);
    const { errorL, capacityL } = await computeTable(tank, { stepMm: 50 });
    expect(errorL / capacityL).toBeLessThan(3e-7);
  });

  it('stay where doubling would take too long: the bound says what that costs', async () => {
    const tank = design([
      ball('a', 600),
      ball('b', 500, [400, 60, 40]),
      ball('c', 500, [-400, 60, 40]),
    ]);
    expect(doubledFacets(placedSolids(tank), first(tank))).toBeNull();
    const { errorL, capacityL } = await computeTable(tank, { stepMm: 50 });
    expect(errorL / capacityL).toBeGreaterThan(1e-6);
    expect(errorL / capacityL).toBeLessThan(1e-5);
  });
});
