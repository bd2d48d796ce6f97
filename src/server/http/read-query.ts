import { DipwrightError } from '~/domain/errors';
import { pointerTo } from './check-by-schema';

/** The query of an address, every name once. */
export function readQuery(url: URL): Record<string, string> {
  const query: Record<string, string> = {};
  for (const [name, value] of url.searchParams) {
    if (Object.hasOwn(query, name)) {
      const detail = `Give "${name.slice(0, 64)}" once.`;
      throw new DipwrightError('invalid', detail, {
        faults: [{ pointer: pointerTo([name]), detail }],
      });
    }
    Object.defineProperty(query, name, { value, enumerable: true });
  }
  return query;
}
