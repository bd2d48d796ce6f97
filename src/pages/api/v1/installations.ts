import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { created, json } from '~/server/http/respond';
import { workshopOperations } from '~/server/openapi/operations/workshop';
import { createInstallation } from '~/server/services/create-installation';
import { listInstallations } from '~/server/services/list-installations';

export const GET = endpoint(workshopOperations.listInstallations, async ({ context, actor }) =>
  json(await listInstallations(context, actor)),
);

export const POST = endpoint(
  workshopOperations.createInstallation,
  async ({ context, actor, body }) => created(await createInstallation(context, actor, body)),
);

export const ALL = otherMethods({ GET, POST });
