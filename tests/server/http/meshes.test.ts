import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { UploadedMesh } from '~/domain/tank/kinds/mesh/uploaded';
import { meshOfBytes } from '~/geometry/mesh-import/mesh-bytes';
import { enclosedVolume } from '~/geometry/mesh';
import { createComputePool, type ComputePool } from '~/server/jobs/compute-pool';
import type { Team } from '../../../db/seeds/add-workshop';
import { asBinaryStl, asObj, boxMesh, turnedOver } from '../../geometry/mesh-import/mesh-files';
import { callApi, cookieOf } from '../support/call-api';
import { addTestWorkshop, openHouse, type House } from '../support/house';

let pool: ComputePool;
let house: House;
let team: Team;
let others: Team;
beforeAll(async () => {
  pool = createComputePool({ threads: 1 });
  house = await openHouse({ computePool: pool });
  team = await addTestWorkshop(house);
  others = await addTestWorkshop(house, 'Beckfoot Tanks');
});
afterAll(async () => {
  await house.drop();
  await pool.close();
});

const box = boxMesh([90, 50, 30]);
const octets = { 'content-type': 'application/octet-stream' };
let address = 0;

async function upload(
  actor: Team['designer'] | null,
  bytes: Uint8Array | ReadableStream,
  query = 'unit=cm&name=Shell',
  headers: Record<string, string> = octets,
) {
  address += 1;
  return callApi(house, 'POST', `/api/v1/meshes?${query}`, {
    cookie: actor === null ? undefined : await cookieOf(house, actor),
    headers,
    raw: bytes as BodyInit,
    clientAddress: `10.0.0.${address}`,
  });
}

const design = (uploadId: string, scale = 10) => ({
  format: 'dipwright-tank',
  version: 1,
  name: 'Shell',
  solids: [{ id: 'shell', role: 'holds', kind: 'mesh', upload: uploadId, scale }],
});

describe('an upload', { timeout: 120_000 }, () => {
  it('is taken, computed with, issued, printed and read again by its workshop', async () => {
    const answer = await upload(team.designer, asBinaryStl(box));
    expect(answer.status).toBe(201);
    const mesh = (await answer.json()) as UploadedMesh;
    expect(mesh).toMatchObject({
      name: 'Shell',
      triangles: 12,
      scale: 10,
      extentMm: [900, 500, 300],
      notes: [],
    });
    expect(mesh.volumeL).toBeCloseTo(135, 9);
    expect(mesh.id).toMatch(
      /^[0-9a-f]{8}-[0-9a-f]{4}-8[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/,
    );

    const cookie = await cookieOf(house, team.designer);
    const table = await callApi(house, 'POST', '/api/v1/compute', {
      cookie,
      json: { design: design(mesh.id), atMm: [100] },
    });
    expect(table.status).toBe(200);
    const { rows } = (await table.json()) as { rows: { volumeL: number }[] };
    expect(rows[0]!.volumeL).toBeCloseTo(45, 9);

    const [installation] = (await (
      await callApi(house, 'POST', '/api/v1/installations', {
        cookie,
        json: { name: 'Van', kind: 'vehicle' },
      })
    )
      .json()
      .then((one: unknown) => [one])) as { id: string }[];
    const tank = (await (
      await callApi(house, 'POST', '/api/v1/tanks', {
        cookie,
        json: {
          installationId: installation!.id,
          name: 'Shell',
          liquid: 'diesel',
          design: design(mesh.id),
        },
      })
    ).json()) as { id: string };
    const issued = await callApi(house, 'POST', `/api/v1/tanks/${tank.id}/revisions`, {
      cookie,
      json: { stepMm: 50 },
    });
    expect(issued.status).toBe(201);
    const revision = (await issued.json()) as { id: string; capacityL: number };
    expect(revision.capacityL).toBeCloseTo(135, 9);
    const chart = await callApi(house, 'GET', `/api/v1/revisions/${revision.id}/chart.pdf`, {
      cookie,
    });
    expect(chart.status).toBe(200);
    expect(
      Buffer.from(await chart.arrayBuffer())
        .subarray(0, 5)
        .toString(),
    ).toBe('%PDF-');

    const kept = await callApi(house, 'GET', `/api/v1/meshes/${mesh.id}`, { cookie });
    expect(kept.status).toBe(200);
    expect(kept.headers.get('cache-control')).toBe('no-store');
    expect(enclosedVolume(meshOfBytes(new Uint8Array(await kept.arrayBuffer())))).toBeCloseTo(
      135_000,
      6,
    );
  });

  it('is kept once however often and from whom it comes, and leaves nothing half behind', async () => {
    const ids = [];
    for (const actor of [team.designer, team.manager, others.designer]) {
      ids.push(((await (await upload(actor, asObj(box))).json()) as UploadedMesh).id);
    }
    expect(new Set(ids).size).toBe(1);
    expect(await readdir(join(house.storageFolder, 'incoming'))).toEqual([]);
    const folders = await readdir(join(house.storageFolder, 'meshes'));
    expect(folders.length).toBeLessThanOrEqual(2);
  });

  it('says what was mended, and in which unit it would be too large', async () => {
    const answer = await upload(team.designer, asBinaryStl(turnedOver(box)));
    expect(await answer.json()).toMatchObject({
      notes: ['The mesh was inside out and was turned over.'],
    });
    const large = await upload(team.designer, asBinaryStl(boxMesh([900, 500, 300])), 'unit=m');
    expect(large.status).toBe(422);
    expect(await large.json()).toMatchObject({
      detail:
        'In m the mesh would be 900000 × 500000 × 300000 mm, and sizes are from 0.01 to 100 000 mm: choose the unit that the file was drawn in.',
    });
  });
});

describe('refused', { timeout: 120_000 }, () => {
  it.each([
    [
      'an open mesh',
      asBinaryStl({ ...box, triangles: box.triangles.slice(6) }),
      /^The mesh is not closed: 1 hole, near x 45, y 25, z 0 \(4 edges\)/,
    ],
    [
      'a lying header',
      asBinaryStl(box).fill(255, 80, 84),
      /its header says 4 294 967 295 triangles/,
    ],
    [
      'what is no mesh',
      new TextEncoder().encode('{"no": "mesh"}'),
      'The file is neither STL nor OBJ: choose one of these.',
    ],
  ])('%s: 422 with sentences', async (_, bytes, sentence) => {
    const answer = await upload(team.designer, bytes);
    expect(answer.status).toBe(422);
    const problem = (await answer.json()) as { detail: string; errors: { detail: string }[] };
    expect(problem.detail).toMatch(sentence);
    expect(problem.errors[0]!.detail).toMatch(sentence);
    expect(await readdir(join(house.storageFolder, 'incoming'))).toEqual([]);
  });

  it('no unit, an unknown one: 422; another media type: 415; no body: 400', async () => {
    expect((await upload(team.designer, asBinaryStl(box), 'name=Shell')).status).toBe(422);
    expect((await upload(team.designer, asBinaryStl(box), 'unit=ft')).status).toBe(422);
    expect(
      (await upload(team.designer, asBinaryStl(box), 'unit=mm', { 'content-type': 'model/stl' }))
        .status,
    ).toBe(415);
    const none = await callApi(house, 'POST', '/api/v1/meshes?unit=mm', {
      cookie: await cookieOf(house, team.designer),
      headers: octets,
    });
    expect(none.status).toBe(400);
  });

  it('nobody 401, an owner and a fitter 403, and the file is not read', async () => {
    for (const [actor, status] of [
      [null, 401],
      [team.owner, 403],
      [team.fitter, 403],
    ] as const) {
      let pulled = 0;
      const stream = new ReadableStream(
        {
          pull: (controller) => {
            pulled += 1;
            controller.enqueue(new Uint8Array(65_536));
          },
        },
        { highWaterMark: 0 },
      );
      expect((await upload(actor, stream)).status).toBe(status);
      expect(pulled).toBe(0);
    }
  });

  it('more than 64 MB: 413, and what comes after is not read', async () => {
    let pulled = 0;
    const stream = new ReadableStream(
      {
        pull: (controller) => {
          pulled += 1;
          controller.enqueue(new Uint8Array(1024 * 1024));
        },
      },
      { highWaterMark: 0 },
    );
    const answer = await upload(team.designer, stream);
    expect(answer.status).toBe(413);
    expect(pulled).toBeLessThan(70);
    expect(await readdir(join(house.storageFolder, 'incoming'))).toEqual([]);
  });

  it('the mesh of another workshop is not found, and is in no design of ours', async () => {
    const own = boxMesh([10, 20, 40]);
    const { id } = (await (await upload(others.designer, asBinaryStl(own))).json()) as UploadedMesh;
    for (const actor of [team.designer, team.manager]) {
      const cookie = await cookieOf(house, actor);
      expect((await callApi(house, 'GET', `/api/v1/meshes/${id}`, { cookie })).status).toBe(404);
      const table = await callApi(house, 'POST', '/api/v1/compute', {
        cookie,
        json: { design: design(id), stepMm: 10 },
      });
      expect(table.status).toBe(422);
      expect(await table.json()).toMatchObject({
        errors: [
          {
            pointer: '/design/solids/0/upload',
            detail:
              'Solid "shell", upload: there is no such mesh in your workshop: upload its file again.',
          },
        ],
      });
    }
    expect((await callApi(house, 'GET', `/api/v1/meshes/${id}`)).status).toBe(401);
    const theirs = await cookieOf(house, others.owner);
    expect((await callApi(house, 'GET', `/api/v1/meshes/${id}`, { cookie: theirs })).status).toBe(
      403,
    );
  });

  it('a design with a mesh is not computed for strangers', async () => {
    const { id } = (await (await upload(team.designer, asBinaryStl(box))).json()) as UploadedMesh;
    const table = await callApi(house, 'POST', '/api/v1/compute', {
      json: { design: design(id), stepMm: 10 },
    });
    expect(table.status).toBe(422);
    expect(await table.json()).toMatchObject({ errors: [{ pointer: '/design/solids/0/upload' }] });
  });
});
