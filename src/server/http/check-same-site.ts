import { DipwrightError } from '~/domain/errors';

const safeMethods = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Refuses a call that another site made a browser send. An unsafe method with a cookie must show
 * where it comes from: Sec-Fetch-Site `same-origin` or `none`, or our own Origin. Without a cookie
 * a program may leave both out, but a browser of another site may not call.
 */
export function checkSameSite(request: Request, ownOrigin: string): void {
  if (safeMethods.includes(request.method)) return;
  const site = request.headers.get('sec-fetch-site');
  const origin = request.headers.get('origin');
  if (site === 'same-origin' || site === 'none' || origin === ownOrigin) return;
  if (site === null && origin === null && !request.headers.has('cookie')) return;
  throw new DipwrightError(
    'forbidden',
    `This call did not come from a page of ${ownOrigin}. A program that sends the session cookie adds the header "Origin: ${ownOrigin}".`,
  );
}
