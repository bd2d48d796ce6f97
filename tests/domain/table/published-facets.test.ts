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

const saddle = {
  ...cylinder('saddle', 500, 900, { at: [300, 500, 200] } as Partial<Solid>),
  ends: [
    { form: 'ellipsoid', depth: 125 },
    { form: 'ellipsoid', depth: 125 },
  ],
} as Solid;
const vesselWithSaddle = design([vessel, saddle]);
const balls = (count: number) =>
  design(Array.from({ length: count }, (_, i) => ball(`b${i}`, 300, [i * 200, 0, 0])));

describe('the facets that a table is published at', () => {
  it('are finest where few triangles must be joined', () => {
    expect(first(design([cylinder('c', 500, 1000)]))).toBe(512);
    expect(first(design([vessel]))).toBe(512);
    // nothing comes near the ends of the vessel: only its barrel is joined
    expect(first(vesselWithDome)).toBe(384);
    expect(first(vesselWithSaddle)).toBe(192);
    const row = Array.from({ length: 20 }, (_, i) =>
      cylinder(`c${i}`, 500, 1000, { at: [i * 700, i * 40, i * 31] } as Partial<Solid>),
    );
    expect(first(design(row))).toBe(256);
  });

  it('are coarser where dozens of balls would take many seconds: the bound says what that costs', async () => {
    expect(first(balls(12))).toBe(128);
    expect(first(balls(60))).toBe(64);
    expect(doubledFacets(placedSolids(balls(60)), 64)).toBeNull();
    const { errorL, capacityL } = await computeTable(balls(60), { stepMm: 100 });
    expect(errorL / capacityL).toBeGreaterThan(1e-5);
    expect(errorL / capacityL).toBeLessThan(2e-4);
  });

  it('are doubled once more where the bound would pass 1e-6 of capacity', async () => {
    expect(bound(vesselWithSaddle, 192)).toBeGreaterThan(1e-6);
    const { errorL, capacityL, triangles } = await computeTable(vesselWithSaddle, { stepMm: 25 });
    expect(errorL / capacityL).toBeLessThan(5e-7);
    const twice = liquidSpace(placedSolids(vesselWithSaddle), 384);
    expect(triangles).toBe(twice.mesh.triangles.length / 3);
  });

  it('of a ball alone are fine at once: nothing has to be joined', async () => {
    const tank = design([ball('ball', 600)]);
    expect(first(tank)).toBe(384);
    const { errorL, capacityL } = await computeTable(tank, { stepMm: 50 });
    expect(errorL / capacityL).toBeLessThan(5e-7);
  });
});
