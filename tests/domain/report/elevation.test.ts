import { beforeAll, describe, expect, it } from 'vitest';
import { elevation } from '~/domain/report/elevation';
import { sketchOf } from '~/domain/report/sketch';
import { computePreview } from '~/domain/table/compute-preview';
import type { TankDocument } from '~/domain/tank/document';
import { loadManifold } from '~/geometry/manifold';

beforeAll(() => loadManifold());

const head = { format: 'dipwright-tank', version: 1, name: 'Tank' } as const;

describe('an elevation', () => {
  it('of a box with a smaller box cut into its far side shows the cut behind the near face', async () => {
    const design: TankDocument = {
      ...head,
      solids: [
        { id: 'body', role: 'holds', kind: 'box', length: 800, width: 400, height: 300 },
        {
          id: 'cut',
          role: 'displaces',
          kind: 'box',
          length: 200,
          width: 150,
          height: 100,
          at: [300, 250, 100],
        },
      ],
    };
    const { space } = await computePreview(design);
    const { lines, minX, maxX, minY, maxY } = elevation(space, 'side');
    expect([minX, maxX, minY, maxY]).toEqual([0, 800, 0, 300]);
    const seen = lines.filter(({ hidden }) => !hidden);
    const hidden = lines.filter((line) => line.hidden);
    expect(seen).toHaveLength(4);
    expect(hidden).toHaveLength(4);
    expect(hidden.every(({ x1, x2 }) => Math.min(x1, x2) >= 300 && Math.max(x1, x2) <= 500)).toBe(
      true,
    );
  });

  it('of sixty balls is found in seconds, not minutes', { timeout: 60_000 }, async () => {
    const design: TankDocument = {
      ...head,
      solids: Array.from({ length: 60 }, (_, i) => ({
        id: `ball ${i}`,
        role: 'holds' as const,
        kind: 'sphere' as const,
        diameter: 200,
        at: [160 * (i % 10), 160 * Math.floor(i / 10), 0] as [number, number, number],
      })),
    };
    const { space, frame } = await computePreview(design);
    const start = performance.now();
    const sketch = sketchOf(space, frame);
    const seconds = (performance.now() - start) / 1000;
    console.log(`${space.triangles.length / 3} triangles: sketch in ${seconds.toFixed(2)} s`);
    expect(sketch.lines.length).toBeGreaterThan(100);
    expect(seconds).toBeLessThan(10);
  });
});
