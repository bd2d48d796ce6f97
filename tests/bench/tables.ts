import { computePreview } from '~/domain/table/compute-preview';
import { computeTable } from '~/domain/table/compute-table';
import { startingPoints } from '~/domain/tank/starting-points';
import { benchDesigns } from './bench-designs';
import { median } from './processor-ms';

const wantedPreviewMs: Readonly<Record<string, number>> = {
  'three solids, tilted': 16,
  'six solids with formed ends, tilted': 50,
};
const wantedTableMs = 500;

/** What people wait for: a live preview, and a published table of 1 mm with its bound. */
export async function tables(): Promise<boolean> {
  let met = true;
  const designs = [
    ...Object.entries(benchDesigns),
    ...startingPoints.map(({ label, design }) => [label, design] as const),
  ];
  console.log('A live preview, warm (95th percentile of 60)');
  for (const [name, design] of designs) {
    for (let run = 0; run < 10; run += 1) await computePreview(design);
    const times: number[] = [];
    for (let run = 0; run < 60; run += 1) {
      const start = performance.now();
      await computePreview(design);
      times.push(performance.now() - start);
    }
    times.sort((one, other) => one - other);
    const wanted = wantedPreviewMs[name] ?? 50;
    if (times[57]! > wanted) met = false;
    console.log(
      `  ${name}: median ${median(times).toFixed(1)} ms, ${times[57]!.toFixed(1)} ms (wanted ${wanted})`,
    );
  }
  console.log(`A published table at 1 mm (N and 2N, bound), warm (wanted ${wantedTableMs} ms)`);
  for (const [name, design] of designs) {
    const times: number[] = [];
    for (let run = 0; run < 4; run += 1) {
      const start = performance.now();
      await computeTable(design, { stepMm: 1 });
      if (run > 0) times.push(performance.now() - start);
    }
    const { rows, triangles, errorL, capacityL } = await computeTable(design, { stepMm: 1 });
    if (median(times) > wantedTableMs) met = false;
    console.log(
      `  ${name}: ${rows.length} rows, ${triangles} triangles, ${median(times).toFixed(0)} ms, bound ${(errorL / capacityL).toExponential(1)} of capacity`,
    );
  }
  return met;
}
