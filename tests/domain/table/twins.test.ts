import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import type { TankDocument } from '~/domain/tank/document';
import { kinds } from '~/domain/tank/kinds/registry';
import { parseDesign } from '~/domain/tank/parse-design';
import { boxAround, membership, upByHand } from '../../support/membership';
import { plainKinds, plainSolid, plainTank, type PlainDesign } from '../../support/plain-tanks';

const count = 150_000;

/**
 * A slower, independent way to the same litres: a lattice of points over the tank, each asked whether it lies
 * in a solid that holds, in none that displaces, and below the surface. It shares no code with the engine: no
 * mesh, no sweep, no frame of its own.
 */
function litresByPoints(
  tank: PlainDesign,
  levels: readonly number[],
): { litres: number[]; boxL: number } {
  const up = upByHand(tank);
  const { low, high } = boxAround(tank);
  const isIn = membership(tank);
  // a rank-1 lattice (generalised golden ratio, R. Roberts 2018, from memory): evener than random points
  const step = [0.8191725133961645, 0.6710436067037893, 0.5497004779019703];
  const inside = levels.map(() => 0);
  for (let n = 0; n < count; n += 1) {
    const p = [0, 1, 2].map(
      (i) => low[i]! + ((0.5 + n * step[i]!) % 1) * (high[i]! - low[i]!),
    ) as unknown as readonly [number, number, number];
    if (!isIn(p)) continue;
    const z = up[0] * p[0] + up[1] * p[1] + up[2] * p[2];
    levels.forEach((level, i) => (inside[i]! += z <= level ? 1 : 0));
  }
  const volume = (high[0]! - low[0]!) * (high[1]! - low[1]!) * (high[2]! - low[2]!);
  return { litres: inside.map((hits) => ((hits / count) * volume) / 1e6), boxL: volume / 1e6 };
}

async function agrees(tank: PlainDesign): Promise<void> {
  const document: TankDocument = parseDesign(tank);
  const whole = await computeTable(document, { stepMm: 10_000 });
  const { heightMm, capacityL } = whole;
  // readings count from the lowest point, where the first drop's centroid lies
  const lowest = whole.rows[0]!.centroidMm;
  const zero = upByHand(tank).reduce((sum, part, axis) => sum + part * lowest[axis]!, 0);
  const atMm = [0.2, 0.45, 0.7, 1].map((share) => share * heightMm);
  const { rows } = await computeTable(document, { atMm });
  const { litres, boxL } = litresByPoints(
    tank,
    atMm.map((reading) => zero + reading),
  );
  // three times the spread that as many random points would have
  const tolerance = 3 * Math.sqrt(boxL / (capacityL * count));
  rows.forEach(({ volumeL }, i) => {
    expect(Math.abs(volumeL - litres[i]!) / capacityL).toBeLessThan(tolerance);
  });
}

describe('counted points agree with', { timeout: 120_000 }, () => {
  const alone = (kind: string) =>
    fc.sample(plainSolid(kind), { numRuns: 3, seed: 31 }).map((solid) => ({
      ...fc.sample(plainTank(1), { numRuns: 1, seed: 5 })[0]!,
      solids: [{ ...solid, id: kind }],
    }));

  it.each(plainKinds.filter((kind) => kinds.some((one) => one.kind === kind)))(
    'a %s at odd sizes and attitudes',
    async (kind) => {
      for (const tank of alone(kind)) await agrees(tank);
    },
  );

  it.each(fc.sample(plainTank(), { numRuns: 10, seed: 2 }).map((tank, i) => [i, tank] as const))(
    'random union and cut-outs number %i',
    async (_, tank) => agrees(tank),
  );
});
