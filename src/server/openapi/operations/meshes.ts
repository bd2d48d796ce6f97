import { z } from 'zod/v4';
import { meshUpload, uploadedMesh } from '~/domain/tank/kinds/mesh/uploaded';
import { operation } from '../../http/operation';

const tag = 'Tanks';

export const meshOperations = {
  uploadMesh: operation({
    id: 'uploadMesh',
    method: 'POST',
    path: '/api/v1/meshes',
    tag,
    summary: 'Upload a closed mesh (STL or OBJ, at most 64 MB) for solids of the kind "mesh"',
    access: 'member',
    limit: 'meshes',
    query: meshUpload,
    sends: 'application/octet-stream',
    answers: [
      {
        status: 201,
        description: 'Taken: its id is the `upload` of a solid.',
        schema: uploadedMesh,
      },
    ],
    problems: [400, 413, 415, 429, 503],
  }),
  readMesh: operation({
    id: 'readMesh',
    method: 'GET',
    path: '/api/v1/meshes/{id}',
    tag,
    summary:
      'A mesh as it is kept: "DWMESH01", counts, corners as doubles, triangles; little-endian',
    access: 'member',
    noun: 'mesh',
    answers: [
      {
        status: 200,
        description: 'The mesh.',
        schema: z.string().meta({ format: 'binary' }),
        mediaType: 'application/octet-stream',
      },
    ],
    problems: [403],
  }),
};
