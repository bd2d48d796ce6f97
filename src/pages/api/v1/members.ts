import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { workshopOperations } from '~/server/openapi/operations/workshop';
import { listMembers } from '~/server/services/list-members';

export const GET = endpoint(workshopOperations.listMembers, async ({ context, actor }) =>
  json(await listMembers(context, actor)),
);

export const ALL = otherMethods({ GET });
