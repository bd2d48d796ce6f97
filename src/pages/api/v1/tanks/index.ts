import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { created, json } from '~/server/http/respond';
import { tankOperations } from '~/server/openapi/operations/tanks';
import { createTank } from '~/server/services/create-tank';
import { listTanks } from '~/server/services/list-tanks';

export const GET = endpoint(tankOperations.listTanks, async ({ context, actor }) =>
  json(await listTanks(context, actor)),
);

export const POST = endpoint(tankOperations.createTank, async ({ context, actor, body }) => {
  const tank = await createTank(context, actor, body);
  return created(tank, { location: `/api/v1/tanks/${tank.id}` });
});

export const ALL = otherMethods({ GET, POST });
