import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { created } from '~/server/http/respond';
import { workshopOperations } from '~/server/openapi/operations/workshop';
import { signUp } from '~/server/services/sign-up';

export const POST = endpoint(workshopOperations.signUp, async ({ context, body }) => {
  const { workshopId, setCookie } = await signUp(context, null, body);
  return created({ workshopId }, { 'set-cookie': setCookie });
});

export const ALL = otherMethods({ POST });
