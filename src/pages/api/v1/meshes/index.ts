import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { sentFile } from '~/server/http/sent-file';
import { created } from '~/server/http/respond';
import { meshOperations } from '~/server/openapi/operations/meshes';
import { uploadMesh } from '~/server/services/upload-mesh';

export const POST = endpoint(
  meshOperations.uploadMesh,
  async ({ context, actor, query, request }) =>
    created(await uploadMesh(context, actor, { ...query, sent: sentFile(request) })),
);

export const ALL = otherMethods({ POST });
