import type { ApiProblem } from '../shared/problem';

/** How long to wait before the same thing is sent again, ms. */
export const retryMs = 4000;

/** No answer, a busy server or a broken one: the same thing may pass later. A refusal stays one. */
export function mayPassLater({ status }: ApiProblem): boolean {
  return status === 0 || status === 429 || status >= 500;
}
