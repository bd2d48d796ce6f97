import type { z } from 'zod/v4';
import { ApiProblem, problemFrom, unreachable } from './problem';

export interface Call<T> {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  body?: unknown;
  headers?: Readonly<Record<string, string>>;
  /** What the answer must be; left out for an answer without a body. */
  answer?: z.ZodType<T>;
  signal?: AbortSignal;
}

export interface Answered<T> {
  value: T;
  etag: string | null;
}

/**
 * One call of `/api/v1`: JSON in, checked JSON out, refusals thrown as `ApiProblem`. Only api.ts
 * uses it. Aborting rejects with the browser's own AbortError, which react-query expects.
 */
export async function call<T = undefined>(
  path: string,
  options: Call<T> = {},
): Promise<Answered<T>> {
  const response = await send(path, options);
  if (!response.ok) throw await problemFrom(response);
  const etag = response.headers.get('etag');
  if (options.answer === undefined) return { value: undefined as T, etag };
  const parsed = options.answer.safeParse(await response.json());
  if (!parsed.success) {
    throw new ApiProblem({
      code: 'unreadable',
      status: response.status,
      message: 'This page is older than the server. Load it again.',
    });
  }
  return { value: parsed.data, etag };
}

/** The bytes of an answer that is no JSON; refusals as with `call`. */
export async function callBytes(path: string): Promise<ArrayBuffer> {
  const response = await send(path, {});
  if (!response.ok) throw await problemFrom(response);
  return response.arrayBuffer();
}

async function send<T>(
  path: string,
  { method = 'GET', body, headers, signal }: Call<T>,
): Promise<Response> {
  try {
    return await fetch(`/api/v1${path}`, {
      method,
      credentials: 'same-origin',
      headers: {
        accept: 'application/json',
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...headers,
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(signal === undefined ? {} : { signal }),
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw unreachable();
  }
}
