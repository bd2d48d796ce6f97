import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { sessionOperations } from '~/server/openapi/operations/session';
import { readWorkshop } from '~/server/services/read-workshop';

export const GET = endpoint(sessionOperations.readMe, async ({ context, actor }) =>
  json(await readWorkshop(context, actor)),
);

export const ALL = otherMethods({ GET });
