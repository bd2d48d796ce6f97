/** Answers of the server, as the browser's fetch would give them. */
export function json(status: number, body: unknown): Response {
  return new Response(JSON.stringify(body), {
    status,
    headers: { 'content-type': 'application/json' },
  });
}

export function problem(status: number, body: Record<string, unknown>): Response {
  return new Response(JSON.stringify({ type: 'about:blank', title: 'Refused', status, ...body }), {
    status,
    headers: { 'content-type': 'application/problem+json' },
  });
}

/** What was sent in the n-th call of a fetch that stands in for the browser's. */
export function sent(
  calls: readonly unknown[][],
  n: number,
): { path: string; headers: Record<string, string>; body: unknown } {
  const [path, init] = calls[n] as [string, { headers: Record<string, string>; body?: string }];
  return {
    path,
    headers: init.headers,
    body: init.body === undefined ? undefined : JSON.parse(init.body),
  };
}
