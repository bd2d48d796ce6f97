/**
 * Judges the Host header before anything else looks at the request: 400 when there is not exactly
 * one or it is malformed, 421 when it is not ours, null when it is. A page never builds an address
 * from a name that a stranger sent.
 */
export function hostFault(
  rawHeaders: readonly string[],
  allowed: readonly string[],
): 400 | 421 | null {
  // Node keeps the first of two Host headers without a word; another server might keep the last.
  const hosts = rawHeaders.filter(
    (_, at) => at % 2 === 1 && rawHeaders[at - 1]?.toLowerCase() === 'host',
  );
  const [host] = hosts;
  if (hosts.length !== 1 || host === undefined || !isHost(host)) return 400;
  return allowed.includes(host.toLowerCase()) ? null : 421;
}

function isHost(text: string): boolean {
  return /^[A-Za-z0-9.-]+(:\d{1,5})?$|^\[[0-9A-Fa-f:]+\](:\d{1,5})?$/.test(text);
}
