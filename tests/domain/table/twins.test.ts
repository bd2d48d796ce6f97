import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import type { TankDocument } from '~/domain/tank/document';
import type { Solid } from '~/domain/tank/kinds/registry';
import { design } from './designs';

const count = 150_000;

/**
 * A slower, independent way to the same litres: a lattice of points over the tank, each asked whether it lies
 * in a solid that holds, in none that displaces, and below the surface. It shares no code with the engine: no
 * mesh, no sweep, no frame of its own.
 */
function litresByPoints(
  tank: TankDocument,
  levels: readonly number[],
): { litres: number[]; boxL: number } {
  const up = upVectorByHand(tank);
  const [low, high] = [
    [1e9, 1e9, 1e9],
    [-1e9, -1e9, -1e9],
  ];
  for (const solid of tank.solids.filter(({ role }) => role === 'holds')) {
    const centre = centreOf(solid);
    const reach = Math.hypot(...sizeOf(solid)) / 2;
    centre.forEach((value, axis) => {
      low[axis] = Math.min(low[axis]!, value - reach);
      high[axis] = Math.max(high[axis]!, value + reach);
    });
  }
  const tests = tank.solids.map((solid) => ({
    holds: solid.role === 'holds',
    inside: membership(solid),
  }));
  // a rank-1 lattice (generalised golden ratio, R. Roberts 2018, from memory): evener than random points
  const step = [0.8191725133961645, 0.6710436067037893, 0.5497004779019703];
  const inside = levels.map(() => 0);
  for (let n = 0; n < count; n += 1) {
    const p = [0, 1, 2].map((i) => low[i]! + ((0.5 + n * step[i]!) % 1) * (high[i]! - low[i]!));
    let wet = false;
    for (const { holds, inside: isIn } of tests) {
      if ((holds ? !wet : true) && isIn(p)) {
        if (!holds) {
          wet = false;
          break;
        }
        wet = true;
      }
    }
    if (!wet) continue;
    const z = up[0]! * p[0]! + up[1]! * p[1]! + up[2]! * p[2]!;
    levels.forEach((level, i) => (inside[i]! += z <= level ? 1 : 0));
  }
  const volume = (high[0]! - low[0]!) * (high[1]! - low[1]!) * (high[2]! - low[2]!);
  return { litres: inside.map((hits) => ((hits / count) * volume) / 1e6), boxL: volume / 1e6 };
}

function sizeOf(solid: Solid): number[] {
  if (solid.kind === 'box' || solid.kind === 'wedge') {
    return [solid.length, solid.width, solid.height];
  }
  if (solid.kind !== 'cylinder') throw new Error(`no twin of a ${solid.kind}`);
  const size = [solid.diameter, solid.diameter, solid.diameter];
  size['xyz'.indexOf(solid.axis ?? 'x')] = solid.length;
  return size;
}

function centreOf(solid: Solid): number[] {
  const size = sizeOf(solid);
  return (solid.at ?? [0, 0, 0]).map((value, axis) => value + size[axis]! / 2);
}

function membership(solid: Solid): (p: readonly number[]) => boolean {
  const centre = centreOf(solid);
  const size = sizeOf(solid);
  const turns = (solid.turn ?? [0, 0, 0]).map((degrees) => (degrees * Math.PI) / 180);
  const [cx, cy, cz] = turns.map(Math.cos) as [number, number, number];
  const [sx, sy, sz] = turns.map(Math.sin) as [number, number, number];
  return (p) => {
    // undo z, then y, then x
    let x = p[0]! - centre[0]!;
    let y = p[1]! - centre[1]!;
    let z = p[2]! - centre[2]!;
    [x, y] = [x * cz + y * sz, -x * sz + y * cz];
    [z, x] = [z * cy + x * sy, -z * sy + x * cy];
    [y, z] = [y * cx + z * sx, -y * sx + z * cx];
    if (Math.abs(x) > size[0]! / 2 || Math.abs(y) > size[1]! / 2 || Math.abs(z) > size[2]! / 2)
      return false;
    if (solid.kind === 'wedge') return z / size[2]! + x / size[0]! <= 0;
    if (solid.kind === 'cylinder') {
      const axis = 'xyz'.indexOf(solid.axis ?? 'x');
      const [a, b] = axis === 0 ? [y, z] : axis === 1 ? [x, z] : [x, y];
      return Math.hypot(a, b) <= solid.diameter / 2;
    }
    return true;
  };
}

function upVectorByHand({ attitude }: TankDocument): number[] {
  const t = (degrees = 0) => Math.tan((degrees * Math.PI) / 180);
  const v = [-t(attitude?.pitch), -t(attitude?.roll), 1];
  return v.map((value) => value / Math.hypot(...v));
}

/** Park and Miller's generator: the same random tanks every time. */
function randomTank(seed: number): TankDocument {
  let state = seed;
  const random = (from: number, to: number) => {
    state = (state * 48_271) % 2_147_483_647;
    return from + ((to - from) * state) / 2_147_483_647;
  };
  const solids = Array.from({ length: 5 }, (_, i): Solid => {
    const fields = {
      id: `s${i}`,
      role: i === 0 || random(0, 1) < 0.6 ? ('holds' as const) : ('displaces' as const),
      at: [random(-300, 200), random(-200, 150), random(-150, 150)] as [number, number, number],
      turn: (random(0, 1) < 0.5
        ? [0, 0, 0]
        : [random(-180, 180), random(-180, 180), random(-180, 180)]) as [number, number, number],
    };
    const [length, width, height] = [random(200, 700), random(150, 500), random(100, 400)];
    const which = random(0, 3);
    if (which < 1) return { ...fields, kind: 'box', length, width, height };
    if (which < 2) return { ...fields, kind: 'wedge', length, width, height };
    return {
      ...fields,
      kind: 'cylinder',
      diameter: width,
      length,
      axis: (['x', 'y', 'z'] as const)[Math.floor(random(0, 3))]!,
    };
  });
  return design(solids, { attitude: { pitch: random(-30, 30), roll: random(-30, 30) } });
}

describe('random unions and cut-outs at random attitudes', { timeout: 90_000 }, () => {
  it.each([11, 22, 33, 44, 55, 66, 77, 88])('agree with counted points (seed %s)', async (seed) => {
    const tank = randomTank(seed);
    const whole = await computeTable(tank, { stepMm: 10_000 });
    const { heightMm, capacityL } = whole;
    // readings count from the lowest point, where the first drop's centroid lies
    const lowest = whole.rows[0]!.centroidMm;
    const zero = upVectorByHand(tank).reduce((sum, part, axis) => sum + part * lowest[axis]!, 0);
    const atMm = [0.2, 0.45, 0.7, 1].map((share) => share * heightMm);
    const { rows } = await computeTable(tank, { atMm });
    const { litres, boxL } = litresByPoints(
      tank,
      atMm.map((reading) => zero + reading),
    );
    // three times the spread that as many random points would have
    const tolerance = 3 * Math.sqrt(boxL / (capacityL * count));
    expect(tolerance).toBeLessThan(0.05);
    rows.forEach(({ volumeL }, i) => {
      expect(Math.abs(volumeL - litres[i]!) / capacityL).toBeLessThan(tolerance);
    });
  });
});
