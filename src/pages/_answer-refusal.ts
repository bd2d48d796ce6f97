import { DipwrightError } from '~/domain/errors';

/** What a page needs of Astro to send the reader elsewhere. */
interface Page {
  url: URL;
  rewrite(path: string): Promise<Response>;
  redirect(path: string): Response;
}

/** A refused service call as a page: sign in first, not found, not yours to do. Anything else rises. */
export async function answerRefusal(error: unknown, page: Page): Promise<Response> {
  if (error instanceof DipwrightError) {
    if (error.code === 'unauthenticated') return toSignIn(page);
    if (error.code === 'not-found') return page.rewrite('/404');
    if (error.code === 'forbidden') return page.rewrite('/403');
  }
  throw error;
}

/** Sign-in, and back to this page afterwards. */
export function toSignIn(page: Pick<Page, 'url' | 'redirect'>): Response {
  return page.redirect(`/sign-in?next=${encodeURIComponent(page.url.pathname + page.url.search)}`);
}
