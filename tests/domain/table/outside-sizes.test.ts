import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computePreview } from '~/domain/table/compute-preview';
import { computeTable } from '~/domain/table/compute-table';
import { liquidSpace } from '~/domain/table/liquid-space';
import type { TankDocument } from '~/domain/tank/document';
import type { Solid } from '~/domain/tank/kinds/registry';
import { placedSolids } from '~/domain/tank/placed-solids';
import { loadManifold } from '~/geometry/manifold';
import { box, cylinder, design, wedge } from './designs';

const outside = (thickness: number) => ({ wall: { thickness, sizes: 'outside' as const } });

async function capacityL(solids: readonly Solid[], wallMm: number): Promise<number> {
  return (await computeTable(design(solids, outside(wallMm)), { stepMm: 50 })).capacityL;
}

async function refusal(document: TankDocument) {
  return computeTable(document, { stepMm: 50 }).then(
    () => {
      throw new Error('it was computed');
    },
    (error: unknown) =>
      error as { message: string; faults: readonly { pointer: string; detail: string }[] },
  );
}

describe('a sloped cistern by its outside sizes', () => {
  // 912 × 512 × 312 outside; the ramp is drawn as wide as the tank, on the inside of a floor of 6 mm
  const cistern = design(
    [
      box('body', [912, 512, 312]),
      wedge('ramp', [800, 512, 60], { role: 'displaces', at: [106, 0, 6], turn: [0, 0, 180] }),
    ],
    { stick: { at: [56, 256] } },
  );

  it('holds 123 L inside a wall of 6 mm, where the same sizes taken as inside give 137', async () => {
    // by hand: inside 900 × 500 × 300 is 135 L; the ramp takes ½ · 800 · 60 · 500 mm³ = 12 L of it
    const table = await computeTable(
      { ...cistern, ...outside(6) },
      { atMm: [0, 30, 60, 150, 300] },
    );
    expect(table.capacityL).toBeCloseTo(123, 9);
    expect(table.heightMm).toBe(300);
    // h ≤ 60: 0.05 h + h²/300 litres; above: 15 + 0.45 (h − 60)
    const litres = table.rows.map(({ volumeL }) => volumeL);
    [0, 4.5, 15, 55.5, 123].forEach((expected, i) => expect(litres[i]).toBeCloseTo(expected, 8));
    const taken = await computeTable(cistern, { stepMm: 50 });
    // 912 · 512 · 312 less the ramp's ½ · 800 · 60 · 512
    expect(taken.capacityL).toBeCloseTo((912 * 512 * 312 - 24_000 * 512) / 1e6, 8);
  });

  it('with the ramp on the outside of the floor holds 133.4 L as inside sizes and about 123 as outside ones', async () => {
    const [body, ramp] = cistern.solids as [Solid, Solid];
    const low = {
      ...cistern,
      solids: [body, { ...ramp, at: [112, 0, 0] as [number, number, number] }],
    };
    const inside = await computeTable(low, { stepMm: 50 });
    expect(inside.capacityL).toBeCloseTo((512 * (912 * 312 - 24_000)) / 1e6, 8);
    // inside the wall the ramp rises from z 6, that is 80 mm from its tip, to the end wall at x 906:
    // ½ · (y₁ + 0) over 714 mm with the slope 60/800, 500 wide
    const rise = (x: number) => ((x - 112) * 60) / 800 - 6;
    const taken = (500 * ((906 - 192) * rise(906))) / 2;
    const { capacityL: litres } = await computeTable({ ...low, ...outside(6) }, { stepMm: 50 });
    expect(litres).toBeCloseTo((900 * 500 * 300 - taken) / 1e6, 8);
  });

  it('outlet and vent lie on the inner wall, not in the outer one', async () => {
    const at = (outlet: [number, number, number]) => ({ ...cistern, ...outside(6), outlet });
    const { undrainableL } = await computeTable(at([56, 256, 6]), { stepMm: 50 });
    expect(undrainableL).toBeCloseTo(0, 9);
    expect((await refusal(at([56, 256, 3]))).faults[0]!.pointer).toBe('/outlet');
  });

  it('is told where the wall leaves nothing, or is none', async () => {
    expect((await refusal({ ...cistern, ...outside(160) })).faults).toEqual([
      {
        pointer: '/wall/thickness',
        detail:
          'Wall, thickness: the wall leaves no space inside. Make it thinner than half the least size of what holds.',
      },
    ]);
    expect((await refusal({ ...cistern, ...outside(0.005) })).faults).toEqual([
      {
        pointer: '/wall/thickness',
        detail: 'Wall, thickness: with outside sizes a wall is at least 0.01 mm thick.',
      },
    ]);
  });
});

describe('one solid less its wall', () => {
  const ball = (d: number) => (Math.PI * d ** 3) / 6;
  const dished = (depth: number) => [
    { form: 'dish' as const, depth },
    { form: 'dish' as const, depth },
  ];
  const slant = Math.hypot(300, 400);
  const singles: [string, Solid, number, number][] = [
    ['box', box('a', [912, 512, 312]), 6, 900 * 500 * 300],
    ['cylinder', cylinder('a', 512, 1012), 6, Math.PI * 250 ** 2 * 1000],
    ['ball', { id: 'a', role: 'holds', kind: 'sphere', diameter: 512 }, 6, ball(500)],
    [
      'cylinder with ends of half a ball',
      cylinder('a', 512, 1000, { ends: dished(256) } as Partial<Solid>),
      6,
      Math.PI * 250 ** 2 * 1000 + ball(500),
    ],
    // the tip moves in by 6/sin of the half-angle = 6 · slant/300, the base by 6: a similar cone
    [
      'cone',
      { id: 'a', role: 'holds', kind: 'cone', start: 0, end: 600, length: 400 },
      6,
      ((Math.PI * 300 ** 2 * 400) / 3) * ((394 - (6 * slant) / 300) / 400) ** 3,
    ],
    // the circle that touches all three sides has the radius (800 + 300 − √(800² + 300²))/2
    [
      'wedge',
      wedge('a', [800, 500, 300]),
      6,
      ((800 * 300) / 2) * (1 - 12 / (1100 - Math.hypot(800, 300))) ** 2 * 488,
    ],
    // sides of 1 in 2: each moves in by 6·√(1 + ¼) level; the bottom rises by 6 along the slope
    [
      'taper',
      {
        id: 'a',
        role: 'holds',
        kind: 'taper',
        bottom: [300, 300],
        top: [600, 600],
        height: 300,
      },
      6,
      (() => {
        const across = 2 * 6 * Math.hypot(1, 0.5);
        const [low, high] = [306 - across, 594 - across];
        return (288 / 3) * (low ** 2 + low * high + high ** 2);
      })(),
    ],
  ];
  it.each(singles)('%s: by closed form', async (_, solid, wallMm, mm3) => {
    expect(Math.abs((await capacityL([solid], wallMm)) / (mm3 / 1e6) - 1)).toBeLessThan(2e-9);
  });

  it('an ellipse that is a circle, and an ellipsoid that is a ball, agree with those within the bound', async () => {
    for (const [solid, mm3] of [
      [
        { id: 'a', role: 'holds', kind: 'oval', length: 1012, width: 512, height: 512 },
        Math.PI * 250 ** 2 * 1000,
      ],
      [
        { id: 'a', role: 'holds', kind: 'ellipsoid', length: 512, width: 512, height: 512 },
        ball(500),
      ],
    ] as [Solid, number][]) {
      const table = await computeTable(design([solid], outside(6)), { stepMm: 50 });
      expect(Math.abs(table.capacityL - mm3 / 1e6)).toBeLessThan(table.errorL);
      expect(table.errorL / table.capacityL).toBeLessThan(6e-6);
      expect(table.heightMm).toBe(500);
    }
  });

  it('an ellipse by the area of its inner parallel curve', async () => {
    // A − L t + π t² while t is less than b²/a; L by the trapezium rule, which is exact to rounding on an ellipse
    const [a, b, t] = [400, 250, 6];
    const n = 4000;
    let girth = 0;
    for (let i = 0; i < n; i += 1) {
      const angle = (2 * Math.PI * i) / n;
      girth += (Math.hypot(a * Math.sin(angle), b * Math.cos(angle)) * 2 * Math.PI) / n;
    }
    const mm2 = Math.PI * a * b - girth * t + Math.PI * t * t;
    const solid = { id: 'a', role: 'holds', kind: 'oval', length: 1012, width: 800, height: 500 };
    const table = await computeTable(design([solid as Solid], outside(t)), { stepMm: 50 });
    expect(Math.abs(table.capacityL - mm2 / 1e3)).toBeLessThan(table.errorL);
    expect(table.heightMm).toBe(488);
  });
});

describe('solids that join', () => {
  it('have no wall between them: flush boxes are one box', async () => {
    const pair = [box('a', [400, 512, 312]), box('b', [512, 512, 312], { at: [400, 0, 0] })];
    expect(await capacityL(pair, 6)).toBeCloseTo(135, 9);
    expect(await checkIssuable(design(pair, outside(6)))).toEqual([]);
    const plates = [box('a', [300, 400, 10]), box('b', [300, 400, 10], { at: [0, 0, 10] })];
    // each of them is all wall by itself
    expect(await capacityL(plates, 6)).toBeCloseTo((288 * 388 * 8) / 1e6, 9);
  });

  it('a box inside another changes nothing', async () => {
    const inner = box('b', [100, 100, 100], { at: [200, 200, 100] });
    expect(await capacityL([box('a', [912, 512, 312]), inner], 6)).toBeCloseTo(135, 8);
  });

  it('two boxes in an L: a quarter of a cylinder stands along the re-entrant edge', async () => {
    // section 588 × 288 + 188 × 200, and the square of 6 between both less the quarter of a circle of 6
    const mm2 = 588 * 288 + 188 * 200 + 36 - (Math.PI * 36) / 4;
    const pair = [box('a', [600, 400, 300]), box('b', [200, 400, 500])];
    expect(await capacityL(pair, 6)).toBeCloseTo((mm2 * 388) / 1e6, 9);
  });

  it('two wedges back to back: the ridge is where both slopes less the wall meet', async () => {
    const roof = [
      wedge('a', [300, 400, 200], { at: [300, 0, 0] }),
      wedge('b', [300, 400, 200], { turn: [0, 0, 180] }),
    ];
    const { heightMm, capacityL: litres } = await computeTable(design(roof, outside(6)), {
      stepMm: 50,
    });
    const scale = 1 - 6 / ((600 * 200) / (600 + 2 * Math.hypot(300, 200)));
    // corners stand on the grid of 1e-6 mm
    expect(litres).toBeCloseTo((60_000 * scale ** 2 * 388) / 1e6, 6);
    expect(heightMm).toBeCloseTo(200 * scale, 6);
  });

  it('a pipe narrower than two walls leaves a dimple at its mouth', async () => {
    const tank = [
      box('a', [300, 400, 200]),
      cylinder('pipe', 10, 100, { axis: 'z', at: [100, 100, 150] } as Partial<Solid>),
    ];
    const { heightMm, capacityL: litres } = await computeTable(design(tank, outside(6)), {
      stepMm: 50,
    });
    // the ball of 6 rises into the mouth of radius 5 by 6 − √(6² − 5²)
    expect(heightMm).toBeGreaterThan(188);
    expect(Math.abs(heightMm - (188 + 6 - Math.sqrt(11)))).toBeLessThan(0.15);
    expect(litres).toBeGreaterThan((288 * 388 * 188) / 1e6);
    expect(litres).toBeLessThan((288 * 388 * 188 + Math.PI * 25 * 6) / 1e6);
  });

  it('two cylinders that cross: the bound holds against point sampling, and they may be issued', async () => {
    const tank = design(
      [
        cylinder('body', 500, 1000),
        cylinder('neck', 200, 300, { axis: 'z', at: [400, 150, 300] } as Partial<Solid>),
      ],
      { ...outside(30), stick: { at: [500, 250] } },
    );
    const table = await computeTable(tank, { stepMm: 100 });
    expect(table.heightMm).toBe(540);
    expect(table.errorL / table.capacityL).toBeLessThan(2e-6);
    // only near the neck is the answer more than both insides: there points are thrown
    const near = { from: [380, 130, 270], to: [620, 370, 520] } as const;
    const share = sampled(near.from, near.to, 20_000, (p) => clearOfOutside(p, 30));
    const mm3 = await volumeIn(tank, near.from, near.to);
    const whole = 240 * 240 * 250;
    // three standard deviations of the count, and what directions 6° apart miss of a ball: 30 (1 − cos 3°)
    const sigma = Math.sqrt((share * (1 - share)) / 20_000);
    expect(Math.abs(mm3 / whole - share)).toBeLessThan(3 * sigma + 0.003);
    expect(await checkIssuable(tank)).toEqual([]);
  }, 60_000);
});

describe('the bench', () => {
  it('draws solids as drawn and says what the wall does to them', async () => {
    const tank = design(
      [
        box('body', [300, 400, 200]),
        cylinder('pipe', 10, 100, { axis: 'z', at: [100, 100, 150] } as Partial<Solid>),
      ],
      outside(6),
    );
    const { solids, notices } = await computePreview(tank);
    expect(solids.map(({ id }) => id)).toEqual(['body', 'pipe']);
    expect(Math.max(...solids[0]!.positions)).toBe(400);
    expect(notices).toEqual([
      'Solid "pipe" is all wall: by itself it has no space inside.',
      'Wall taken off with a coarse ball where solids join: issued litres are finer.',
    ]);
  });
});

describe('whatever the wall', () => {
  it('volume falls as it grows, and two walls one in the other are one of both', async () => {
    await loadManifold();
    await fc.assert(
      fc.asyncProperty(
        fc.double({ min: 1, max: 40, noNaN: true }),
        fc.double({ min: 1, max: 40, noNaN: true }),
        async (one, other) => {
          const lying = (d: number, l: number) => cylinder('a', d, l);
          const both = await preview([lying(500, 700)], one + other);
          expect(both).toBeLessThan(await preview([lying(500, 700)], one));
          const twice = await preview([lying(500 - 2 * one, 700 - 2 * one)], other);
          // corners stand on the grid of 1e-6 mm
          expect(Math.abs(both / twice - 1)).toBeLessThan(1e-8);
          const oval = (l: number, w: number, h: number): Solid => ({
            id: 'a',
            role: 'holds',
            kind: 'oval',
            length: l,
            width: w,
            height: h,
          });
          expect(await preview([oval(700, 600, 400)], one + other)).toBeLessThan(
            await preview([oval(700, 600, 400)], one),
          );
        },
      ),
      { numRuns: 8, seed: 7 },
    );
  });
});

async function preview(solids: readonly Solid[], wallMm: number): Promise<number> {
  return (await computePreview(design(solids, outside(wallMm)))).capacityL;
}

/** Volume of the liquid space in an upright box, which displaces everything about it. mm³ */
async function volumeIn(
  tank: TankDocument,
  from: readonly [number, number, number],
  to: readonly [number, number, number],
): Promise<number> {
  await loadManifold();
  const far = 3000;
  const around = [0, 1, 2].flatMap((axis) => {
    const slab = (low: number, high: number) => {
      const at: [number, number, number] = [-far, -far, -far];
      const size: [number, number, number] = [3 * far, 3 * far, 3 * far];
      at[axis] = low;
      size[axis] = high - low;
      return box(`${axis} ${low}`, size, { role: 'displaces', at });
    };
    return [slab(-far, from[axis]!), slab(to[axis]!, far)];
  });
  const solids = placedSolids({ ...tank, solids: [...tank.solids, ...around] });
  return liquidSpace(solids, 256).volumeMm3;
}

/** Independent of all geometry: a point of the crossed cylinders whose ball of `mm` stays inside them. */
function clearOfOutside([x, y, z]: readonly [number, number, number], mm: number): boolean {
  const inUnion = (a: number, b: number, c: number) =>
    (a >= 0 && a <= 1000 && Math.hypot(b - 250, c - 250) <= 250) ||
    (c >= 300 && c <= 600 && Math.hypot(a - 500, b - 250) <= 100);
  if (!inUnion(x, y, z)) return false;
  return directions.every(([u, v, w]) => inUnion(x + mm * u, y + mm * v, z + mm * w));
}

/** 1200 directions, about 6° apart: a spiral from pole to pole with the golden angle between two. */
const directions = Array.from({ length: 1200 }, (_, i) => {
  const w = 1 - (2 * i + 1) / 1200;
  const angle = i * Math.PI * (3 - Math.sqrt(5));
  const across = Math.sqrt(1 - w * w);
  return [across * Math.cos(angle), across * Math.sin(angle), w] as const;
});

function sampled(
  from: readonly [number, number, number],
  to: readonly [number, number, number],
  count: number,
  inside: (point: readonly [number, number, number]) => boolean,
): number {
  let state = 20_260_101;
  const random = () => {
    // Park and Miller's multiplicative generator
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
  let hits = 0;
  for (let i = 0; i < count; i += 1) {
    const point = [0, 1, 2].map((axis) => from[axis]! + random() * (to[axis]! - from[axis]!));
    if (inside(point as unknown as readonly [number, number, number])) hits += 1;
  }
  return hits / count;
}
