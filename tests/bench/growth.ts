import { placedShape, placedSolid } from '~/domain/tank/placed-solid';
import { meshOf } from '~/geometry/manifold';
import { sweep } from '~/geometry/sweep';
import { evenLevels } from './even-levels';
import { medianMs } from './processor-ms';

const most = 4.6;
const up = [0.1, -0.05, Math.sqrt(1 - 0.0125)] as const;

/** How time grows with triangles and with rows: four times as many of either take at most 4.6 times as long. */
export function growth(): boolean {
  console.log(`Growth of the sweep (four times as much: at most ${most} times as long)`);
  let met = true;
  const ball = placedSolid({ id: 'ball', role: 'holds', kind: 'sphere', diameter: 1000 });
  const meshes = [88, 176, 352, 704].map((facets) => meshOf(placedShape(ball, facets), [0, 0, 0]));
  const times = meshes.map((mesh) => {
    const levels = evenLevels(mesh, up, 400);
    return medianMs(() => sweep(mesh, up, levels), 9);
  });
  met =
    say(
      'triangles',
      meshes.map((mesh) => mesh.triangles.length / 3),
      times,
    ) && met;

  const rows = [1000, 4000, 16_000, 64_000];
  const byRows = rows.map((count) => {
    const levels = evenLevels(meshes[1]!, up, count);
    return medianMs(() => sweep(meshes[1]!, up, levels), 9);
  });
  return say('rows', rows, byRows) && met;
}

function say(what: string, counts: readonly number[], times: readonly number[]): boolean {
  const factors = times.slice(1).map((time, i) => time / times[i]!);
  const list = counts.map((count, i) => `${count} in ${times[i]!.toFixed(2)} ms`).join(', ');
  console.log(`  ${what}: ${list}; times ${factors.map((f) => f.toFixed(2)).join(', ')}`);
  return factors.every((factor) => factor <= most);
}
