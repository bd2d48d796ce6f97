import { expect, it } from 'vitest';
import { silhouetteOf } from '~/components/silhouette';
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
