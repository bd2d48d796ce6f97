import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { revisionOperations } from '~/server/openapi/operations/revisions';
import { readRevision } from '~/server/services/read-revision';

export const GET = endpoint(revisionOperations.readRevision, async ({ context, actor, id }) =>
  json(await readRevision(context, actor, { revisionId: id })),
);

export const ALL = otherMethods({ GET });
