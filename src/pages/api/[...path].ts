import type { APIRoute } from 'astro';
import { DipwrightError } from '~/domain/errors';
import { problem } from '~/server/http/problem';

/** Every address below /api that no route answers. */
export const ALL: APIRoute = ({ locals }) =>
  problem(
    new DipwrightError('not-found', 'There is no such address: /api lists those that there are.'),
    locals.requestId,
  );
