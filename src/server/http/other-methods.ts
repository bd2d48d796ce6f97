import type { APIRoute } from 'astro';
import { DipwrightError } from '~/domain/errors';
import { problem } from './problem';

/**
 * What a route answers to the methods it does not have: 405 with Allow. HEAD is GET without the
 * body. Export it as `ALL` beside the methods it is given.
 */
export function otherMethods(routes: Readonly<Partial<Record<string, APIRoute>>>): APIRoute {
  const names = Object.keys(routes);
  const allow = [...names, ...(names.includes('GET') ? ['HEAD'] : [])].join(', ');
  return async (call) => {
    const get = routes['GET'];
    if (call.request.method === 'HEAD' && get !== undefined) {
      const full = await get(call);
      return new Response(null, { status: full.status, headers: full.headers });
    }
    const error = new DipwrightError(
      'method-not-allowed',
      `This address answers ${allow}, not ${call.request.method}.`,
    );
    return problem(error, call.locals.requestId, { allow });
  };
}
