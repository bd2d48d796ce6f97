import { register } from 'tsx/esm/api';

// a thousand rebuilds as the worker of the bench makes them; told: memory after every hundred, MB
register();
const { computePreview } = await import('../../src/domain/table/compute-preview.ts');
const { benchDesigns } = await import('../bench/bench-designs.ts');

const designs = Object.values(benchDesigns);
const marks = [];
for (let run = 1; run <= 1000; run += 1) {
  const design = structuredClone(designs[run % designs.length]);
  design.solids[0].length += run % 50;
  await computePreview(design);
  if (run % 100 === 0) {
    globalThis.gc();
    const { heapUsed, external, rss } = process.memoryUsage();
    marks.push([heapUsed, external, rss].map((bytes) => Math.round(bytes / 1e5) / 10));
  }
}
process.send(marks);
process.disconnect();
