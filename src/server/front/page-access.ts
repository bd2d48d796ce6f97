const publicPages = new Set(['/', '/sign-in', '/sign-up', '/404', '/500']);

/**
 * Does this page need somebody to be signed in? Every page does unless it is listed; calls of the
 * API answer for themselves.
 */
export function needsSession(path: string): boolean {
  if (path === '/api' || path.startsWith('/api/') || path === '/readyz') return false;
  return !publicPages.has(path.length > 1 ? path.replace(/\/+$/, '') : path);
}

/** Where to sign in and come back from: always a path of this host. */
export function signInAddress(path: string, query: string): string {
  return `/sign-in?next=${encodeURIComponent(path + query)}`;
}
