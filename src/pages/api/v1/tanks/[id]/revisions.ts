import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { created, json } from '~/server/http/respond';
import { revisionOperations } from '~/server/openapi/operations/revisions';
import { issueRevision } from '~/server/services/issue-revision';
import { listRevisions } from '~/server/services/list-revisions';

export const GET = endpoint(revisionOperations.listRevisions, async ({ context, actor, id }) =>
  json(await listRevisions(context, actor, { tankId: id })),
);

export const POST = endpoint(
  revisionOperations.issueRevision,
  async ({ context, actor, id, body }) => {
    const revision = await issueRevision(context, actor, { tankId: id, ...body });
    return created(revision, { location: `/api/v1/revisions/${revision.id}` });
  },
);

export const ALL = otherMethods({ GET, POST });
