import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { revisionOperations } from '~/server/openapi/operations/revisions';
import { lookUpDepth } from '~/server/services/look-up-depth';

export const GET = endpoint(revisionOperations.lookUpDepth, async ({ context, actor, id, query }) =>
  json(await lookUpDepth(context, actor, { revisionId: id, volumeL: query.volumeL })),
);

export const ALL = otherMethods({ GET });
