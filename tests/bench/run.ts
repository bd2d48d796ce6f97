import Module from 'manifold-3d';
import { loadManifold, spaceOf } from '~/geometry/manifold';
import { enclosedVolume } from '~/geometry/mesh';
import { sweep } from '~/geometry/sweep';
import { computePreview } from '~/domain/table/compute-preview';
import { computeTable } from '~/domain/table/compute-table';
import type { TankDocument } from '~/domain/tank/document';
import { startingPoints } from '~/domain/tank/starting-points';
import { placedShape, placedSolid } from '~/domain/tank/placed-solid';

/**
 * npm run bench: what the engine costs, measured against the mesh library's own way (cut off what is above,
 * ask for the volume) on the same mesh in the same run. The limit on the ratio holds where a table takes time,
 * for tanks with one round solid or two solids; a few flat faces are cut in a twentieth of a millisecond, and
 * a tank of many booleans spends its time building. Exits 1 when a limit is missed.
 */
const rows = 400;
/** Turns that ours and theirs take, and tables we make in each. */
const turns = 20;
const runsATurn = 10;
const facets = 128;
const wantedRatio = 100;
const wantedPreviewMs = 50;

const cylinderAndBox: TankDocument = {
  format: 'dipwright-tank',
  version: 1,
  name: 'Lying cylinder with a box through its top',
  solids: [
    { id: 'barrel', role: 'holds', kind: 'cylinder', diameter: 1400, length: 2400 },
    {
      id: 'box',
      role: 'holds',
      kind: 'box',
      length: 900,
      width: 800,
      height: 1200,
      at: [950, 400, 600],
    },
  ],
};

const withColumn: TankDocument = {
  ...cylinderAndBox,
  name: 'The same with a round column through it, tilted',
  solids: [
    ...cylinderAndBox.solids,
    {
      id: 'column',
      role: 'displaces',
      kind: 'cylinder',
      diameter: 300,
      length: 1900,
      axis: 'z',
      at: [300, 500, -50],
    },
  ],
  attitude: { pitch: 3, roll: 2 },
};

await loadManifold();
let missed = 0;

console.log(`A table of ${rows} rows, build included, at ${facets} facets a turn, processor time`);
for (const design of [...startingPoints.map((one) => one.design), cylinderAndBox, withColumn]) {
  const solids = design.solids.map(placedSolid);
  const shapes = (role: string) =>
    solids.filter(({ solid }) => solid.role === role).map((one) => placedShape(one, facets));
  const [holds, displaces] = [shapes('holds'), shapes('displaces')];

  const build = () => {
    const built = spaceOf(holds, displaces, [0, 0, 0]);
    return sweep(built, [0, 0, 1], levelsOf(built.positions)).volume;
  };
  const mesh = spaceOf(holds, displaces, [0, 0, 0]);
  const levels = levelsOf(mesh.positions);
  const cut = await cutter(mesh);
  const volumes = new Float64Array(rows);
  for (let run = 0; run < 200; run += 1) build();

  // both in turn, so that whatever else the machine does falls on both alike
  let oursMs = 0;
  let theirsMs = 0;
  for (let turn = 0; turn < turns; turn += 1) {
    oursMs += processorMs(() => {
      for (let run = 0; run < runsATurn; run += 1) build();
    });
    theirsMs += processorMs(() => {
      for (let row = turn; row < rows; row += turns) volumes[row] = cut(levels[row]!);
    });
  }
  oursMs /= turns * runsATurn;
  const ratio = theirsMs / oursMs;
  const whole = enclosedVolume(mesh);
  const gap = Math.max(...build().map((volume, row) => Math.abs(volume - volumes[row]!))) / whole;
  const limited = solids.length <= 2 && solids.some(({ kind, solid }) => kind.curved(solid));
  if (limited && ratio < wantedRatio) missed += 1;
  console.log(
    `  ${design.name}: ${mesh.triangles.length / 3} triangles, ours ${oursMs.toFixed(2)} ms, cut row by row ` +
      `${theirsMs.toFixed(0)} ms, ratio ${ratio.toFixed(0)}${limited ? ` (wanted ${wantedRatio})` : ''}; they differ by ${gap.toExponential(1)} of the whole`,
  );
}

console.log('A live preview, warm');
for (const { label, design } of startingPoints) {
  let slowest = 0;
  const times: number[] = [];
  for (let run = 0; run < 15; run += 1) {
    const start = performance.now();
    await computePreview(design);
    const ms = performance.now() - start;
    if (run >= 5) times.push(ms);
    slowest = Math.max(...times);
  }
  times.sort((a, b) => a - b);
  const median = times[times.length >> 1]!;
  if (median > wantedPreviewMs) missed += 1;
  console.log(
    `  ${label}: median ${median.toFixed(1)} ms, slowest of ten ${slowest.toFixed(1)} ms (wanted ${wantedPreviewMs})`,
  );
}

console.log('A published table at 1 mm (N and 2N, bound), warm');
for (const design of [...startingPoints.map((one) => one.design), cylinderAndBox, withColumn]) {
  await computeTable(design, { stepMm: 1 });
  const start = performance.now();
  const { rows: made, triangles, errorL, capacityL } = await computeTable(design, { stepMm: 1 });
  const ms = performance.now() - start;
  console.log(
    `  ${design.name}: ${made.length} rows, ${triangles} triangles, ${ms.toFixed(0)} ms, bound ${(errorL / capacityL).toExponential(1)} of capacity`,
  );
}
process.exitCode = missed > 0 ? 1 : 0;

function levelsOf(positions: Float64Array): Float64Array {
  let low = Infinity;
  let high = -Infinity;
  for (let i = 2; i < positions.length; i += 3) {
    low = Math.min(low, positions[i]!);
    high = Math.max(high, positions[i]!);
  }
  return Float64Array.from({ length: rows }, (_, i) => low + ((high - low) * (i + 1)) / (rows + 1));
}

/** Processor time of some work, ms: what other processes take does not count. */
function processorMs(work: () => void): number {
  const start = process.cpuUsage();
  work();
  const { user, system } = process.cpuUsage(start);
  return (user + system) / 1000;
}

/** The library's own way: cut off what is above a level, ask for the volume. Building the mesh is not counted. */
async function cutter(mesh: { positions: Float64Array; triangles: Uint32Array }) {
  const library = await Module();
  library.setup();
  const { Manifold, Mesh } = library;
  const solid = Manifold.ofMesh(
    new Mesh({
      numProp: 3,
      vertProperties: Float32Array.from(mesh.positions),
      triVerts: mesh.triangles,
    }),
  );
  const cut = (level: number): number => {
    const wet = solid.trimByPlane([0, 0, -1], -level);
    const volume = wet.volume();
    wet.delete();
    return volume;
  };
  for (let run = 0; run < 20; run += 1) cut(0.5 * (levelsOf(mesh.positions)[0]! + 1));
  return cut;
}
