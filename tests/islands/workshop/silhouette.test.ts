import { expect, it } from 'vitest';
import { silhouetteOf } from '~/components/silhouette';
import type { TankDocument } from '~/domain/tank/document';
import type { Solid } from '~/domain/tank/kinds/registry';
import { startingPoints } from '~/domain/tank/starting-points';

const drawn = (code: string) =>
  silhouetteOf(startingPoints.find((point) => point.code === code)!.design)!;
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
  expect(Math.min(...times)).toBeLessThan(50);
  const { holds, viewBox } = silhouetteOf(balls(100))!;
  expect(holds.join('').length).toBeLessThan(100_000);
  // 9 steps of 80 mm, or 18 of 90 mm, and a ball; 3 % of paper on either side
  const [, , width] = viewBox.split(' ').map(Number);
  expect([820, 1720].some((mm) => Math.abs(width! / 1.06 - mm) < 0.01 * mm)).toBe(true);
});

const tankOf = (...solids: Solid[]): TankDocument => ({
  format: 'dipwright-tank',
  version: 1,
  name: 'Tank',
  solids,
});

const uShape: [number, number][] = [
  [0, 0],
  [900, 0],
  [900, 600],
  [650, 600],
  [650, 200],
  [250, 200],
  [250, 450],
  [0, 450],
];

const u = (rest: Partial<Solid> = {}): Solid =>
  ({ id: 'u', role: 'holds', kind: 'prism', width: 400, profile: uShape, ...rest }) as Solid;

it('draws a U as a U: its eight corners and nothing between the legs', () => {
  const { holds } = silhouetteOf(tankOf(u()))!;
  expect(holds).toHaveLength(1);
  const drawnCorners = corners(holds[0]!).map((p) => p.split(' ').map(Number));
  expect(drawnCorners).toHaveLength(8);
  for (const [x, z] of uShape) expect(drawnCorners).toContainEqual([x, -z + 0]);
});

it('draws a U from its side, which tells more than its end', () => {
  const [, , width] = silhouetteOf(tankOf(u()))!.viewBox.split(' ').map(Number);
  expect(width! / 1.06).toBeCloseTo(900, -1);
  // its end is a full rectangle, also of a U that is as wide as it is long
  const [, , wide] = silhouetteOf(tankOf(u({ width: 2000 })))!
    .viewBox.split(' ')
    .map(Number);
  expect(wide! / 1.06).toBeCloseTo(900, -1);
});

it('draws a turned U with the gap that one can see through, and nothing more', () => {
  // 30° turned, seen from the side: of the gap 400·cos 30° wide, 400·sin 30° are behind the near leg
  const { holds } = silhouetteOf(tankOf(u({ turn: [0, 0, 30] })))!;
  const bottom = corners(holds[0]!)
    .map((p) => p.split(' ').map(Number) as [number, number])
    .filter(([, y]) => Math.abs(y + 200) < 0.11)
    .map(([x]) => x)
    .sort((a, b) => a - b);
  expect(bottom).toHaveLength(2);
  expect(bottom[1]! - bottom[0]!).toBeCloseTo(400 * Math.cos(Math.PI / 6) - 200, 0);
});

it('draws a U that displaces as a U', () => {
  const body: Solid = {
    id: 'b',
    role: 'holds',
    kind: 'box',
    length: 1200,
    width: 400,
    height: 800,
  };
  const { displaces } = silhouetteOf(
    tankOf(body, u({ role: 'displaces', at: [100, 0, 0] } as Partial<Solid>)),
  )!;
  expect(corners(displaces[0]!)).toHaveLength(8);
});

it('draws nothing of a tank whose mesh is not loaded here', () => {
  const mesh: Solid = { id: 'm', role: 'holds', kind: 'mesh', upload: 'not-here', scale: 1 };
  expect(silhouetteOf(tankOf(mesh))).toBeNull();
});

it('draws two hundred U profiles in no time', () => {
  // others use the processor too: the best of more shapes never drawn before
  const times = Array.from({ length: 20 }, (_, k) => 400 + k).map((width) => {
    const solids = Array.from({ length: 200 }, (_, i) =>
      u({ id: `u${i}`, width, at: [90 * (i % 20), 0, 80 * Math.floor(i / 20)], turn: [0, 0, i] }),
    );
    const design = tankOf(...solids);
    const start = performance.now();
    silhouetteOf(design);
    return performance.now() - start;
  });
  console.log(`200 U profiles: ${times.map((ms) => ms.toFixed(1)).join(', ')} ms`);
  expect(Math.min(...times)).toBeLessThan(50);
});
