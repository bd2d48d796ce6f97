import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { serviceOperations } from '~/server/openapi/operations/service';
import { checkReadiness } from '~/server/services/check-readiness';

export const GET = endpoint(serviceOperations.readyz, async ({ context }) => {
  const readiness = await checkReadiness(context);
  return json(readiness, { status: readiness.ready ? 200 : 503 });
});

export const ALL = otherMethods({ GET });
