import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { noContent } from '~/server/http/respond';
import { sessionOperations } from '~/server/openapi/operations/session';
import { signIn } from '~/server/services/sign-in';
import { signOut } from '~/server/services/sign-out';

export const POST = endpoint(sessionOperations.signIn, async ({ context, body, request }) => {
  const cookieHeader = request.headers.get('cookie');
  const { setCookie } = await signIn(context, null, { ...body, cookieHeader });
  return noContent({ 'set-cookie': setCookie });
});

export const DELETE = endpoint(sessionOperations.signOut, async ({ context, actor, request }) => {
  const { setCookie } = await signOut(context, actor, {
    cookieHeader: request.headers.get('cookie'),
  });
  return noContent({ 'set-cookie': setCookie });
});

export const ALL = otherMethods({ POST, DELETE });
