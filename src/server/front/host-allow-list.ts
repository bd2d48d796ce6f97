/**
 * Judges the Host header before anything else looks at the request: 400 when it is missing or
 * malformed, 421 when it is not ours, null when it is. A page never builds an address from a name
 * that a stranger sent.
 */
export function hostFault(host: string | undefined, allowed: readonly string[]): 400 | 421 | null {
  if (host === undefined || !/^[A-Za-z0-9.-]+(:\d{1,5})?$|^\[[0-9A-Fa-f:]+\](:\d{1,5})?$/.test(host)) return 400;
  return allowed.includes(host.toLowerCase()) ? null : 421;
}
