import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { revisionOperations } from '~/server/openapi/operations/revisions';
import { readTable } from '~/server/services/read-table';

export const GET = endpoint(revisionOperations.readTable, async ({ context, actor, id }) => {
  const { revision, rows } = await readTable(context, actor, { revisionId: id });
  return json({ revision, rows });
});

export const ALL = otherMethods({ GET });
