import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { revisionOperations } from '~/server/openapi/operations/revisions';
import { computeTable } from '~/server/services/compute-table';

export const POST = endpoint(revisionOperations.computeTable, async ({ context, actor, body }) =>
  json(await computeTable(context, actor, body)),
);

export const ALL = otherMethods({ POST });
