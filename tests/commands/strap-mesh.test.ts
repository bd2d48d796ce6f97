import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { runStrap } from '~/commands/strap/run-strap';
import type { ComputedTable } from '~/domain/table/request';
import { asAsciiStl, asBinaryStl, asObj, boxMesh } from '../geometry/mesh-import/mesh-files';

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'strap-mesh-'));
  await mkdir(join(folder, 'meshes'));
  // 90 × 50 × 30 cm
  const box = boxMesh([90, 50, 30], [5, 6, 7]);
  await writeFile(join(folder, 'meshes', 'box.stl'), asBinaryStl(box));
  await writeFile(join(folder, 'meshes', 'text.stl'), asAsciiStl(box));
  await writeFile(join(folder, 'box.obj'), asObj(box));
  await writeFile(
    join(folder, 'open.stl'),
    asBinaryStl({ ...box, triangles: box.triangles.slice(6) }),
  );
  await writeFile(join(folder, 'no.stl'), 'nothing of the kind');
});
afterAll(() => rm(folder, { recursive: true }));

async function strap(upload: string) {
  const file = join(folder, 'design.json');
  const solids = [
    { id: 'body', role: 'holds', kind: 'mesh', upload, scale: 10 },
    {
      id: 'ramp',
      role: 'displaces',
      kind: 'wedge',
      length: 800,
      width: 500,
      height: 60,
      at: [100, 0, 0],
      turn: [0, 0, 180],
    },
  ];
  await writeFile(
    file,
    JSON.stringify({
      format: 'dipwright-tank',
      version: 1,
      name: 'Cistern',
      solids,
      stick: { at: [50, 250] },
    }),
  );
  return runStrap([file, '--at', '30,60,150,300']);
}

it.each(['meshes/box.stl', './meshes/text.stl', 'box.obj'])(
  'a mesh beside the design file: %s with a sloped floor holds 4.5, 15, 55.5 and 123 L',
  async (upload) => {
    const { stdout, stderr, exitCode } = await strap(upload);
    expect({ stderr, exitCode }).toEqual({ stderr: '', exitCode: 0 });
    const { rows } = JSON.parse(stdout) as ComputedTable;
    // by hand: 0.05 h + h²/300 up to 60 mm, then 15 + 0.45 (h − 60)
    [4.5, 15, 55.5, 123].forEach((litres, i) => expect(rows[i]!.volumeL).toBeCloseTo(litres, 6));
  },
);

it.each([
  ['none.stl', 'there is none beside the design file that can be read.'],
  ['meshes', 'there is none beside the design file that can be read.'],
  ['no.stl', 'the file is neither STL nor OBJ: choose one of these.'],
  [
    'open.stl',
    'the mesh is not closed: 1 hole, near x 50, y 31, z 7 (4 edges). Close it in the program that wrote it.',
  ],
])('%s is at fault: exit 2, one sentence with solid and field', async (upload, sentence) => {
  expect(await strap(upload)).toEqual({
    stdout: '',
    stderr: `Solid "body", upload: the file ${upload}: ${sentence}\n`,
    exitCode: 2,
  });
});
