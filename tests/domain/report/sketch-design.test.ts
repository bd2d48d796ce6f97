import { describe, expect, it } from 'vitest';
import { sketchDesign } from '~/domain/report/sketch-design';
import { box, cylinder, design, slopedCistern } from '../table/designs';

const balls = (count: number) =>
  design(
    Array.from({ length: count }, (_, i) => ({
      id: `ball ${i}`,
      role: 'holds',
      kind: 'sphere',
      diameter: 200,
      at: [160 * (i % 10), 160 * Math.floor(i / 10), 0],
    })),
  );

describe('the sketch of a design', () => {
  it('of a box with a smaller box cut into its far side shows the cut behind the near face', async () => {
    const cut = box('cut', [200, 150, 100], { role: 'displaces', at: [300, 250, 100] });
    const { lines, widthMm, heightMm } = await sketchDesign(
      design([box('body', [800, 400, 300]), cut]),
    );
    expect([widthMm, heightMm]).toEqual([800, 300]);
    const hidden = lines.filter((line) => line.hidden);
    expect(lines.length - hidden.length).toBe(4);
    expect(hidden).toHaveLength(4);
    for (const { x1, x2 } of hidden) {
      expect(Math.min(x1, x2)).toBeGreaterThanOrEqual(300);
      expect(Math.max(x1, x2)).toBeLessThanOrEqual(500);
    }
  });

  it('has the stick where the design has it, from its zero to the roof', async () => {
    const { stick } = await sketchDesign({ ...slopedCistern, stick: { at: [850, 250] } });
    // the ramp rises 60 mm over 800 mm from x = 100: 56.25 mm at x = 850
    expect(stick).toEqual({ x: 850, zeroY: 56.25, roofY: 300 });
  });

  it('of many balls is as large as they are, on few enough triangles', async () => {
    const start = performance.now();
    const { widthMm, heightMm, lines } = await sketchDesign(balls(200));
    const seconds = (performance.now() - start) / 1000;
    // from the end: 20 rows of balls 160 mm apart; from the side: 10
    expect([1640, 3240].some((mm) => Math.abs(widthMm - mm) < 8)).toBe(true);
    expect(Math.abs(heightMm - 200)).toBeLessThan(8);
    expect(lines.length).toBeGreaterThan(50);
    expect(seconds).toBeLessThan(20);
  }, 40_000);
});

it('tells the overall sizes of round tanks as they are, not as their chords stand', async () => {
  const ball = await sketchDesign(
    design([{ id: 'ball', role: 'holds', kind: 'sphere', diameter: 400 }]),
  );
  expect([ball.widthMm, ball.heightMm]).toEqual([400, 400]);
  const barrel = await sketchDesign(design([cylinder('barrel', 600, 900)]));
  // seen from its end: a circle says more than a rectangle
  expect([barrel.view, barrel.widthMm, barrel.heightMm]).toEqual(['end', 600, 600]);
});
