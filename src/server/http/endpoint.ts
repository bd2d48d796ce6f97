import type { APIContext, APIRoute } from 'astro';
import { DipwrightError, notFound } from '~/domain/errors';
import type { Actor, Context } from '../context';
import { answerError } from './answer-error';
import { checkBySchema } from './check-by-schema';
import { checkSameSite } from './check-same-site';
import type { Access, Operation } from './operation';
import { checkLimit } from './rate-limits';
import { readJson } from './read-json';
import { readQuery } from './read-query';

/** What a route's handler is given: everything checked. */
export interface Call<B, Q, A extends Access> {
  context: Context;
  actor: A extends 'member' ? Actor : Actor | null;
  /** The `{id}` of the path; empty where the path has none. */
  id: string;
  body: B;
  query: Q;
  request: Request;
}

/**
 * A route: checks a request against its operation (origin, rate, session, path, query, body, in
 * that order), calls the handler, and turns whatever is thrown into problem+json.
 */
export function endpoint<B, Q, A extends Access>(
  operation: Operation<B, Q, A>,
  handle: (call: Call<B, Q, A>) => Promise<Response>,
): APIRoute {
  return async ({ request, locals, params, url }) => {
    const { context, requestId } = locals;
    try {
      checkSameSite(request, context.config.http.origin);
      if (operation.limit !== undefined) checkLimit(context, operation.limit, locals.clientAddress);
      const actor = actorFor(operation, locals);
      const id = idIn(operation, params);
      const query =
        operation.query === undefined ? undefined : checkBySchema(operation.query, readQuery(url));
      const body =
        operation.body === undefined
          ? undefined
          : checkBySchema(operation.body, await readJson(request));
      return await handle({ context, actor, id, body: body as B, query: query as Q, request });
    } catch (error) {
      return answerError(error, context.log, requestId);
    }
  };
}

function actorFor<A extends Access>(
  operation: Operation<never, never, A> | Operation<unknown, unknown, A>,
  locals: App.Locals,
): Call<unknown, unknown, A>['actor'] {
  if (operation.access === 'member' && locals.actor === null) {
    throw new DipwrightError(
      'unauthenticated',
      'Sign in first: this is for members of a workshop.',
    );
  }
  return locals.actor as Call<unknown, unknown, A>['actor'];
}

/** An id of another form is nobody's: "not found", and the database is not asked. */
function idIn(operation: { path: string; noun?: string }, params: APIContext['params']): string {
  if (!operation.path.includes('{id}')) return '';
  const id = params['id'] ?? '';
  if (!/^[0-9a-f-]{36}$/.test(id)) throw notFound(operation.noun ?? 'thing');
  return id;
}
