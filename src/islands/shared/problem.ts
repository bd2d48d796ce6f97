import type { FieldFault } from '~/domain/errors';

/**
 * What the server refused, or that it could not be reached. `message` is a sentence for the person;
 * `faults` say which field is wrong and what would be right; `facts` travel with some codes
 * (for `precondition-failed`: etag, savedBy, savedAt, design).
 */
export class ApiProblem extends Error {
  /** A code of the domain's errors, or `unreachable` when no answer came. */
  readonly code: string;
  /** HTTP status; 0 when no answer came. */
  readonly status: number;
  readonly faults: readonly FieldFault[];
  readonly facts: Readonly<Record<string, unknown>>;
  readonly requestId: string | null;

  constructor(options: {
    code: string;
    status: number;
    message: string;
    faults?: readonly FieldFault[];
    facts?: Readonly<Record<string, unknown>>;
    requestId?: string | null;
  }) {
    super(options.message);
    this.name = 'ApiProblem';
    this.code = options.code;
    this.status = options.status;
    this.faults = options.faults ?? [];
    this.facts = options.facts ?? {};
    this.requestId = options.requestId ?? null;
  }
}

const known = new Set(['type', 'title', 'status', 'detail', 'code', 'requestId', 'errors']);

/** Reads a problem+json answer; an answer that is no problem document still becomes a sentence. */
export async function problemFrom(response: Response): Promise<ApiProblem> {
  const body = await readJson(response);
  if (body === null) {
    return new ApiProblem({
      code: 'unreadable',
      status: response.status,
      message: `The server answered with ${response.status} and no explanation. Try again in a minute.`,
    });
  }
  return new ApiProblem({
    code: text(body['code']) ?? 'unknown',
    status: response.status,
    message:
      text(body['detail']) ?? text(body['title']) ?? `The server answered with ${response.status}.`,
    faults: faultsOf(body['errors']),
    facts: Object.fromEntries(Object.entries(body).filter(([key]) => !known.has(key))),
    requestId: text(body['requestId']),
  });
}

/** No answer came: the line is down, or the server is. What was typed is still here. */
export function unreachable(): ApiProblem {
  return new ApiProblem({
    code: 'unreachable',
    status: 0,
    message:
      'No answer from the server. What you typed is still here: try again when you have signal.',
  });
}

/** Any thrown thing as a problem, so that a screen always has a sentence to show. */
export function asProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  const message = error instanceof Error ? error.message : 'Something went wrong on this page.';
  return new ApiProblem({ code: 'unexpected', status: 0, message });
}

async function readJson(response: Response): Promise<Record<string, unknown> | null> {
  const type = response.headers.get('content-type') ?? '';
  if (!type.includes('json')) return null;
  try {
    const body: unknown = await response.json();
    return typeof body === 'object' && body !== null ? (body as Record<string, unknown>) : null;
  } catch {
    return null;
  }
}

function faultsOf(errors: unknown): FieldFault[] {
  if (!Array.isArray(errors)) return [];
  return errors.flatMap((entry: { pointer?: unknown; detail?: unknown } | null) => {
    const pointer = text(entry?.pointer);
    const detail = text(entry?.detail);
    return pointer !== null && detail !== null ? [{ pointer, detail }] : [];
  });
}

function text(value: unknown): string | null {
  return typeof value === 'string' ? value : null;
}
