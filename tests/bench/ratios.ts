import { publishedFacets } from '~/domain/table/published-facets';
import { placedShape, placedSolid } from '~/domain/tank/placed-solid';
import { startingPoints } from '~/domain/tank/starting-points';
import type { TankDocument } from '~/domain/tank/document';
import { meshOf, spaceOf } from '~/geometry/manifold';
import { enclosedVolume, type Mesh } from '~/geometry/mesh';
import { placing } from '~/geometry/placing';
import { sweep } from '~/geometry/sweep';
import { benchDesigns } from './bench-designs';
import { cutRowByRow } from './cut-row-by-row';
import { evenLevels } from './even-levels';
import { processorMs } from './processor-ms';

const rows = 400;
/** Turns that ours and theirs take, so that whatever else the machine does falls on both alike. */
const turns = 20;
const up = [0, 0, 1] as const;
const wanted = { whole: 130, sweepAlone: 1500 };

/**
 * A table of 400 rows against the mesh library's cut and volume row by row, on the same mesh in the same run.
 * Limits hold for the tanks they are said of; the rest is printed. True when every limit is met.
 */
export async function ratios(): Promise<boolean> {
  console.log(
    `A table of ${rows} rows against cutting the same mesh row by row, processor time (wanted: build included ` +
      `${wanted.whole}, sweep alone ${wanted.sweepAlone} times faster)`,
  );
  let met = true;
  for (const [name, design] of Object.entries(benchDesigns)) {
    const fine = publishedFacets(design.solids.map(placedSolid));
    for (const [fineness, facets] of [
      ['preview', 64],
      ['issue', fine],
    ] as const) {
      const { build, mesh } = built(design, facets);
      met = (await compare(`${name}, ${fineness} (${facets})`, mesh, build, true)) && met;
    }
  }
  const ball = ballMesh(704);
  met = (await compare('a mesh as it was taken in', ball, null, true)) && met;
  for (const { label, design } of startingPoints) {
    const { build, mesh } = built(design, 128);
    await compare(`${label} (128)`, mesh, build, false);
  }
  return met;
}

function built(design: TankDocument, facets: number): { build: () => Mesh; mesh: Mesh } {
  const solids = design.solids.map(placedSolid);
  const shapes = (role: string) =>
    solids.filter(({ solid }) => solid.role === role).map((one) => placedShape(one, facets));
  const build = () => spaceOf(shapes('holds'), shapes('displaces'), [0, 0, 0]);
  return { build, mesh: build() };
}

/** A ball of about facets² triangles, as a mesh and nothing else. */
function ballMesh(facets: number): Mesh {
  const solid = placedSolid({ id: 'ball', role: 'holds', kind: 'sphere', diameter: 1000 });
  const place = placing([0, 0, 0], [1000, 1000, 1000], [0, 0, 0]);
  return meshOf({ shape: placedShape(solid, facets).shape, place }, [0, 0, 0]);
}

async function compare(
  name: string,
  mesh: Mesh,
  build: (() => Mesh) | null,
  limited: boolean,
): Promise<boolean> {
  const triangles = mesh.triangles.length / 3;
  const levels = evenLevels(mesh, up, rows);
  const ours = () => {
    const made = build ? build() : mesh;
    return sweep(made, up, evenLevels(made, up, rows)).volume;
  };
  const sweepOnly = () => sweep(mesh, up, levels);
  const cut = await cutRowByRow(mesh);
  const volumes = new Float64Array(rows);
  const heavy = triangles > 50_000;
  const runs = heavy ? 1 : 10;
  for (let run = 0; run < (heavy ? 2 : 100); run += 1) ours();
  for (let run = 0; run < (heavy ? 1 : 20); run += 1) cut(levels[rows >> 1]!);

  let [oursMs, sweepMs, theirsMs] = [0, 0, 0];
  const parts = heavy ? 4 : turns;
  // of a heavy mesh every tenth row is cut, and the time counted tenfold
  const every = heavy ? 10 : 1;
  for (let turn = 0; turn < parts; turn += 1) {
    oursMs += processorMs(() => {
      for (let run = 0; run < runs; run += 1) ours();
    });
    sweepMs += processorMs(() => {
      for (let run = 0; run < runs; run += 1) sweepOnly();
    });
    theirsMs += processorMs(() => {
      for (let row = turn * every; row < rows; row += parts * every)
        volumes[row] = cut(levels[row]!);
    });
  }
  oursMs /= parts * runs;
  sweepMs /= parts * runs;
  theirsMs *= every;
  const whole = enclosedVolume(mesh);
  const gap = Math.max(
    ...Array.from(ours(), (volume, row) =>
      volumes[row] === 0 ? 0 : Math.abs(volume - volumes[row]!) / whole,
    ),
  );
  const [ratio, alone] = [theirsMs / oursMs, theirsMs / sweepMs];
  console.log(
    `  ${name}: ${triangles} triangles, ours ${oursMs.toFixed(2)} ms (sweep ${sweepMs.toFixed(2)}), row by row ` +
      `${theirsMs.toFixed(0)} ms: ${ratio.toFixed(0)} times, sweep alone ${alone.toFixed(0)}; they differ by ${gap.toExponential(1)}`,
  );
  return !limited || (ratio >= wanted.whole && alone >= wanted.sweepAlone);
}
