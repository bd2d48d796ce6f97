import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { tankOperations } from '~/server/openapi/operations/tanks';
import { changeTank } from '~/server/services/change-tank';
import { readTank } from '~/server/services/read-tank';

export const GET = endpoint(tankOperations.readTank, async ({ context, actor, id }) =>
  json(await readTank(context, actor, { tankId: id })),
);

export const PATCH = endpoint(tankOperations.changeTank, async ({ context, actor, id, body }) =>
  json(await changeTank(context, actor, { tankId: id, change: body })),
);

export const ALL = otherMethods({ GET, PATCH });
