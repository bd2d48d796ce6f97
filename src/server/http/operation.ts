import type { z } from 'zod/v4';
import type { LimitName } from './rate-limits';

/** `member`: only with a session; `anybody`: also without. What a role may do is the service's to say. */
export type Access = 'anybody' | 'member';

export interface Answer {
  status: number;
  description: string;
  /** Left out: no body. */
  schema?: z.ZodType;
  /** Where the body is not JSON. */
  mediaType?: string;
  headers?: Readonly<Record<string, string>>;
}

/** One call of the API: what its route checks and what the OpenAPI document says, from the same words. */
export interface Operation<B = unknown, Q = unknown, A extends Access = Access> {
  /** operationId, e.g. `issueRevision`. */
  id: string;
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** As in OpenAPI: `/api/v1/tanks/{id}`. */
  path: string;
  /** Group in the document. */
  tag: string;
  summary: string;
  access: A;
  /** What `{id}` names, for "there is no such …". */
  noun?: string;
  limit?: LimitName;
  body?: z.ZodType<B>;
  query?: z.ZodType<Q>;
  /** Media type of a body that is a file, read by the handler piece by piece. */
  sends?: string;
  /** Header name → what it is for. */
  headers?: Readonly<Record<string, { description: string; required: boolean }>>;
  answers: readonly Answer[];
  /** Statuses of problem+json that this call is known to give besides the usual ones. */
  problems?: readonly number[];
}

/** Keeps the types of body, query and access. */
export function operation<B, Q, A extends Access>(what: Operation<B, Q, A>): Operation<B, Q, A> {
  return what;
}
