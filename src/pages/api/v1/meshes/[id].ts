import { createReadStream } from 'node:fs';
import { Readable } from 'node:stream';
import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { meshOperations } from '~/server/openapi/operations/meshes';
import { readMesh } from '~/server/services/read-mesh';

export const GET = endpoint(meshOperations.readMesh, async ({ context, actor, id }) => {
  const { file, bytes } = await readMesh(context, actor, { meshId: id });
  return new Response(Readable.toWeb(createReadStream(file)) as ReadableStream, {
    headers: {
      'cache-control': 'no-store',
      'content-type': 'application/octet-stream',
      'content-length': String(bytes),
    },
  });
});

export const ALL = otherMethods({ GET });
