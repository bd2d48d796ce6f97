import { describe, expect, it } from 'vitest';
import { computePreview } from '~/domain/table/compute-preview';
import { computeTable } from '~/domain/table/compute-table';
import { curveFromRows, depthAt, volumeAt } from '~/domain/table/curve';
import { clampReading, levelOfReading, readingOfLevel } from '~/domain/table/level';
import { startingPoints } from '~/domain/tank/starting-points';
import { enclosedVolume } from '~/geometry/mesh';
import { sectionLoops } from '~/geometry/section';
import { box, design, slopedCistern } from './designs';

describe('computePreview', () => {
  it.each(startingPoints.map(({ label, design: tank }) => [label, tank] as const))(
    'agrees with the published table: %s',
    async (_, tank) => {
      const preview = await computePreview(tank);
      const table = await computeTable(tank, { atMm: preview.rows.map(({ depthMm }) => depthMm) });
      expect(preview.pieces).toBe(1);
      expect(preview.notices).toEqual([]);
      preview.rows.forEach(({ volumeL }, i) => {
        expect(Math.abs(volumeL - table.rows[i]!.volumeL) / table.capacityL).toBeLessThan(5e-5);
      });
      expect(Math.abs(preview.capacityL / table.capacityL - 1)).toBeLessThan(1e-8);
      expect(preview.frame.heightMm).toBe(table.heightMm);
    },
  );

  it('tells of every row the wetted area and what a millimetre of reading means', async () => {
    const upright = design([box('body', [900, 500, 300])], {
      attitude: { pitch: 10, roll: 0 },
      stick: { at: [450, 250] },
    });
    const { rows, frame } = await computePreview(upright);
    const tilt = (10 * Math.PI) / 180;
    expect(frame.levelPerReading).toBeCloseTo(Math.cos(tilt), 12);
    // at half the stick the surface runs from end to end and parts the box in two equal halves
    const middle = rows[100]!;
    expect(middle.depthMm).toBeCloseTo(150, 9);
    expect(middle.volumeL).toBeCloseTo(67.5, 9);
    expect(middle.surfaceCm2).toBeCloseTo((900 * 500) / Math.cos(tilt) / 100, 6);
    expect(middle.slopeLPerMm).toBeCloseTo((900 * 500) / 1e6, 9);
    expect(middle.wettedCm2).toBeCloseTo((900 * 500 + (900 + 500) * 300) / 100, 6);
    // the slope is that of the litres over the reading
    for (let i = 70; i <= 130; i += 10) {
      const chord = (rows[i + 1]!.volumeL - rows[i - 1]!.volumeL) / 3;
      expect(rows[i]!.slopeLPerMm / chord).toBeCloseTo(1, 9);
    }
  });

  it('draws the space and each solid in the frame of the tank', async () => {
    const { space, solids, capacityL } = await computePreview(slopedCistern);
    expect(enclosedVolume(space) / 1e6).toBeCloseTo(capacityL, 9);
    expect(solids.map(({ id, role }) => [id, role])).toEqual([
      ['body', 'holds'],
      ['ramp', 'displaces'],
    ]);
    expect(enclosedVolume(solids[0]!) / 1e6).toBeCloseTo(135, 9);
    expect(enclosedVolume(solids[1]!) / 1e6).toBeCloseTo(12, 9);
    const xs = solids[1]!.positions.filter((_, i) => i % 3 === 0);
    expect([Math.min(...xs), Math.max(...xs)]).toEqual([100, 900]);
  });

  it('ties readings, levels and the surface in the picture together', async () => {
    const tilted = { ...slopedCistern, attitude: { pitch: 4, roll: -2 } };
    const { frame, space, rows } = await computePreview(tilted);
    const level = levelOfReading(frame, 100);
    expect(readingOfLevel(frame, level)).toBeCloseTo(100, 10);
    // the surface passes through the stick 100 mm above its zero
    const [x, y] = frame.stick!.at;
    const z = frame.stick!.zeroZ + 100;
    expect(frame.up[0] * x + frame.up[1] * y + frame.up[2] * z).toBeCloseTo(level, 10);
    expect(sectionLoops(space, frame.up, level)).toHaveLength(1);
    expect(clampReading(frame, -5)).toBe(0);
    expect(clampReading(frame, 1e9)).toBe(frame.heightMm);

    const curve = curveFromRows(rows, frame.levelPerReading);
    const [exact] = (await computeTable(tilted, { atMm: [101.3] })).rows;
    expect(volumeAt(curve, 101.3)).toBeCloseTo(exact!.volumeL, 4);
    expect(depthAt(curve, exact!.volumeL)).toBeCloseTo(101.3, 2);
  });

  it('counts pieces and says so', async () => {
    const apart = design([
      box('a', [100, 100, 100]),
      box('b', [100, 100, 100], { at: [200, 0, 0] }),
    ]);
    const preview = await computePreview(apart);
    expect(preview.pieces).toBe(2);
    expect(preview.notices).toEqual([expect.stringMatching(/^The liquid space is in 2 pieces/)]);
  });
});
