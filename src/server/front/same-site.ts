import type { IncomingHttpHeaders } from 'node:http';

const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * May this request act? A method that changes something must say that it comes from our own pages:
 * by Sec-Fetch-Site, which a browser sets and no page can, or by an Origin equal to ours. One that
 * carries no cookie (a program with a device key, curl) can act for nobody by accident and passes,
 * unless a browser says that it comes from elsewhere: signing somebody in to a stranger's
 * account is an act too.
 */
export function mayAct(
  method: string,
  headers: IncomingHttpHeaders,
  origins: readonly string[],
): boolean {
  if (safeMethods.has(method)) return true;
  const site = headers['sec-fetch-site'];
  if (site !== undefined) return site === 'same-origin';
  const { origin } = headers;
  if (origin !== undefined) return origins.includes(origin);
  return headers.cookie === undefined;
}

/**
 * Is this a body that a plain form of any site could send without asking? The API takes none.
 * Astro would refuse some of them by a rule of its own, with an answer that is no problem+json.
 */
export function isFormBody(headers: IncomingHttpHeaders): boolean {
  const type = headers['content-type']?.split(';', 1)[0]?.trim().toLowerCase();
  if (type === undefined) return hasBody(headers);
  return ['application/x-www-form-urlencoded', 'multipart/form-data', 'text/plain'].includes(type);
}

function hasBody(headers: IncomingHttpHeaders): boolean {
  return headers['transfer-encoding'] !== undefined || Number(headers['content-length'] ?? 0) > 0;
}
