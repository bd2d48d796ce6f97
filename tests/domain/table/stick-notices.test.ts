import { describe, expect, it } from 'vitest';
import { computePreview } from '~/domain/table/compute-preview';
import { computeTable } from '~/domain/table/compute-table';
import { stickNoticeSentence } from '~/domain/table/stick-notice-sentence';
import { box, cylinder, design, slopedCistern } from './designs';

/** A wheel arch right across the floor, 100 high: 300 of floor on one side of it, 500 on the other. */
const acrossTheFloor = design(
  [
    box('body', [1000, 400, 300]),
    box('wheel arch', [200, 400, 100], { role: 'displaces', at: [300, 0, 0] }),
  ],
  { stick: { at: [150, 200] }, outlet: [150, 200, 20], vent: [150, 200, 300] },
);

describe('two pools under one stick', () => {
  it('are told with the reading at which they join', async () => {
    const { stickNotices } = await computePreview(acrossTheFloor);
    expect(stickNotices).toEqual([{ what: 'pools', readingMm: 100, pools: 2 }]);
    expect(stickNoticeSentence(stickNotices[0]!, 'mm')).toMatch(
      /^Below 100\u00a0mm the liquid stands in 2 pools/,
    );
    expect(stickNoticeSentence(stickNotices[0]!, 'in')).toMatch(/^Below 3 7\/8\u00a0in/);
  });

  it('count every hollow, and the highest sill', async () => {
    const { stickNotices } = await computePreview(
      design(
        [
          box('body', [1000, 100, 300]),
          box('low sill', [100, 100, 80], { role: 'displaces', at: [200, 0, 0] }),
          box('high sill', [100, 100, 120], { role: 'displaces', at: [600, 0, 0] }),
        ],
        { stick: { at: [100, 50] } },
      ),
    );
    expect(stickNotices).toEqual([{ what: 'pools', readingMm: 120, pools: 3 }]);
  });

  it('read along a tilted stick', async () => {
    // lower at +x: the pool at +x spills over the sill's near edge at x 500, the other over its top at x 300
    const tilted = { ...acrossTheFloor, attitude: { pitch: 5, roll: 0 } };
    const { stickNotices } = await computePreview(tilted);
    const slope = Math.tan((5 * Math.PI) / 180);
    // they join over the highest line of the sill's top, at x 300; the surface falls by slope a mm towards −x
    expect(stickNotices).toHaveLength(1);
    expect(stickNotices[0]!.readingMm).toBeCloseTo(100 - 150 * slope, 9);
  });

  it('are not told of a puddle that comes to nothing, nor of a floor in one', async () => {
    expect((await computePreview(slopedCistern)).stickNotices).toEqual([]);
    const dent = design(
      [
        box('body', [1000, 400, 300]),
        box('ring', [1000, 400, 0.02], { role: 'displaces' }),
        box('dent', [1, 1, 0.02], { at: [20, 20, 0] }),
      ],
      { stick: { at: [500, 200] } },
    );
    expect((await computePreview(dent)).stickNotices).toEqual([]);
    expect((await computePreview(design([cylinder('barrel', 500, 900)]))).stickNotices).toEqual([]);
  });
});

describe('a stick that something crosses', () => {
  const shelf = design(
    [
      box('body', [1000, 400, 300]),
      box('shelf', [400, 400, 20], { role: 'displaces', at: [0, 0, 180] }),
    ],
    { stick: { at: [200, 200] } },
  );

  it('sees the lowest open stretch and says so', async () => {
    const { stickNotices, frame } = await computePreview(shelf);
    expect(frame.heightMm).toBe(180);
    expect(stickNotices).toEqual([{ what: 'crossed', readingMm: 180, by: 'shelf' }]);
    expect(stickNoticeSentence(stickNotices[0]!, 'mm')).toBe(
      '“shelf” crosses the stick at 180\u00a0mm: readings end there, though the tank holds more above it.',
    );
  });

  it('reads above it when its zero stands there', async () => {
    const above = { ...shelf, stick: { at: [200, 200] as [number, number], zero: 190 } };
    const { stickNotices, frame } = await computePreview(above);
    expect([frame.stick!.zeroZ, frame.heightMm]).toEqual([190, 110]);
    expect(stickNotices).toEqual([]);
    const [row] = (await computeTable(above, { atMm: [10] })).rows;
    // z 200, less the shelf
    expect(row!.volumeL).toBeCloseTo(1000 * 0.4 * 0.2 - 0.4 * 0.4 * 20, 9);
  });
});

describe('what the outlet leaves and the vent traps', () => {
  it('has its place, its height and its litres', async () => {
    const { standing, undrainableL } = await computePreview(acrossTheFloor);
    expect(undrainableL).toBeCloseTo(2.4 + 20, 9);
    const [own, behind] = [...standing].sort((one, other) => one.litres - other.litres);
    expect(own).toMatchObject({ what: 'undrainable', levelMm: 20 });
    expect(own!.litres).toBeCloseTo(2.4, 9);
    expect(own!.at[0]).toBeLessThanOrEqual(300);
    expect(behind).toMatchObject({ what: 'undrainable', levelMm: 100 });
    expect(behind!.litres).toBeCloseTo(20, 9);
    expect(behind!.at[0]).toBeGreaterThanOrEqual(500);
    expect(behind!.at[2]).toBe(0);
  });

  it('tells the pocket of air at the upper end of a tilted tank', async () => {
    const tank = design([box('body', [1000, 400, 300])], {
      attitude: { pitch: 10, roll: 0 },
      vent: [1000, 200, 300],
    });
    const { standing, trappedL, frame } = await computePreview(tank);
    expect(standing).toHaveLength(1);
    expect(standing[0]!.what).toBe('trapped');
    expect(standing[0]!.at).toEqual([0, expect.any(Number), 300]);
    expect(trappedL).toBeCloseTo(0.5 * 1000 * Math.tan(Math.PI / 18) * 0.4, 6);
    // its surface passes through the vent
    const [ux, , uz] = frame.up;
    expect(standing[0]!.levelMm).toBeCloseTo(1000 * ux + 300 * uz, 9);
  });
});

it('names separate chambers by the solids they lie in', async () => {
  const { notices, pieces } = await computePreview(
    design([
      box('port', [100, 100, 100]),
      box('trunk', [20, 20, 50], { at: [40, 40, 90] }),
      cylinder('starboard', 100, 100, { at: [0, 300, 0] }),
    ]),
  );
  expect(pieces).toBe(2);
  expect(notices).toEqual([
    expect.stringMatching(
      /^The liquid space is in 2 pieces, which one stick cannot tell apart: “port”, “trunk” \(1\.0 L\) and “starboard” \(0\.8 L\)\./,
    ),
  ]);
});
