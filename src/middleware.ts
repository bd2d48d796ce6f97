import { randomUUID } from 'node:crypto';
import { defineMiddleware } from 'astro:middleware';
import { developmentContext } from './server/development-context';
import { needsSession, signInAddress } from './server/front/page-access';

/** Who asks, before any page or call of the API: from the session cookie, never from the client. */
export const onRequest = defineMiddleware(async ({ request, url, locals, redirect }, next) => {
  // Our own entry gives these; under `npm run dev` the framework runs without it.
  locals.context ??= await developmentContext();
  locals.requestId ??= randomUUID();
  locals.clientAddress ??= 'development';
  try {
    locals.actor = await locals.context.sessions.readActor(request.headers.get('cookie'));
  } catch (error) {
    locals.context.log.error('the session could not be read', {
      error,
      requestId: locals.requestId,
    });
    return new Response(null, { status: 503, headers: { 'Retry-After': '10' } });
  }
  if (locals.actor === null && needsSession(url.pathname)) {
    return redirect(signInAddress(url.pathname, url.search), 303);
  }
  const response = await next();
  // Whatever a page shows belongs to whoever asked.
  if (!response.headers.has('cache-control')) response.headers.set('Cache-Control', 'no-store');
  return response;
});
