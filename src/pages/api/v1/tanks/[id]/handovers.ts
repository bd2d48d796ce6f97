import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { created, json } from '~/server/http/respond';
import { tankOperations } from '~/server/openapi/operations/tanks';
import { handOverTank } from '~/server/services/hand-over-tank';
import { listHandovers } from '~/server/services/list-handovers';

export const GET = endpoint(tankOperations.listHandovers, async ({ context, actor, id }) =>
  json(await listHandovers(context, actor, { tankId: id })),
);

export const POST = endpoint(tankOperations.handOverTank, async ({ context, actor, id, body }) =>
  created(await handOverTank(context, actor, { tankId: id, ...body })),
);

export const ALL = otherMethods({ GET, POST });
