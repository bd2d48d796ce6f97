import { expect, it } from 'vitest';
import { silhouetteOf } from '~/components/silhouette';
import type { TankDocument } from '~/domain/tank/document';
import { startingPoints } from '~/domain/tank/starting-points';

const drawn = (code: string) =>
  silhouetteOf(startingPoints.find((point) => point.code === code)!.design);
const corners = (path: string) => path.slice(1, -1).split('L');

it('draws a box from the side by its four corners', () => {
  const { holds, displaces } = drawn('plain-box');
  expect(holds).toHaveLength(1);
  // 800 × 300, y runs down
  expect(new Set(corners(holds[0]!).map((p) => p.replace('-0', '0')))).toEqual(
    new Set(['0 0', '800 0', '800 -300', '0 -300']),
  );
  expect(displaces).toEqual([]);
});

it('draws a V hull by its two halves meeting at the keel', () => {
  const { holds } = drawn('v-hull');
  const all = holds.flatMap(corners).map((p) => p.split(' ').map(Number) as [number, number]);
  const keel = all.filter(([, y]) => y > -5);
  expect(keel.length).toBeGreaterThan(0);
  for (const [x] of keel) expect(Math.abs(x - 300)).toBeLessThan(6);
  expect(Math.min(...all.map(([x]) => x))).toBeCloseTo(0, 0);
  expect(Math.max(...all.map(([x]) => x))).toBeCloseTo(600, 0);
});

it('shows a lying cylinder from its end and a wheel arch where it cuts in', () => {
  const [, , width, height] = drawn('lying-cylinder').viewBox.split(' ').map(Number);
  expect(width).toBeCloseTo(height!, 5);
  expect(drawn('wheel-arch').displaces).toHaveLength(1);
});

it('draws a shape once, however often it is shown, and another shape anew', () => {
  const { design } = startingPoints.find(({ code }) => code === 'wheel-arch')!;
  const first = silhouetteOf(structuredClone(design));
  expect(silhouetteOf({ ...structuredClone(design), name: 'Another name' })).toBe(first);
  const [body, ...rest] = design.solids;
  const taller = { ...design, solids: [{ ...body!, height: 400 } as typeof body & {}, ...rest] };
  expect(silhouetteOf(taller as typeof design)).not.toEqual(first);
});

it('draws two hundred solids in no time and a few kilobytes', () => {
  const balls = (diameter: number): TankDocument => ({
    format: 'dipwright-tank',
    version: 1,
    name: 'Two hundred balls',
    solids: Array.from({ length: 200 }, (_, i) => ({
      id: `ball ${i}`,
      role: i % 5 === 0 ? ('displaces' as const) : ('holds' as const),
      kind: 'sphere' as const,
      diameter,
      at: [90 * (i % 20), 80 * Math.floor(i / 20), i % 7] as [number, number, number],
    })),
  });
  // the best of several shapes never drawn before: others use the processor too
  const times = [100, 101, 102, 103, 104, 105, 106].map((diameter) => {
    const design = balls(diameter);
    const start = performance.now();
    silhouetteOf(design);
    return performance.now() - start;
  });
  console.log(`200 solids: ${times.map((ms) => ms.toFixed(1)).join(', ')} ms`);
  expect(Math.min(...times)).toBeLessThan(20);
  const { holds, viewBox } = silhouetteOf(balls(100));
  expect(holds.join('').length).toBeLessThan(100_000);
  // 9 steps of 80 mm, or 18 of 90 mm, and a ball; 3 % of paper on either side
  const [, , width] = viewBox.split(' ').map(Number);
  expect([820, 1720].some((mm) => Math.abs(width! / 1.06 - mm) < 0.01 * mm)).toBe(true);
});
