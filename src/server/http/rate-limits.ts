import { DipwrightError } from '~/domain/errors';
import type { Context } from '../context';
import { createBuckets, type Buckets } from './token-bucket';

/** Calls a client address may make: `burst` at once, then `perSecond`. */
export const limits = {
  compute: { burst: 120, perSecond: 2 },
  session: { burst: 60, perSecond: 0.5 },
  workshops: { burst: 20, perSecond: 1 / 30 },
  meshes: { burst: 20, perSecond: 1 / 10 },
} as const;
export type LimitName = keyof typeof limits;

const bucketsOf = new WeakMap<Context, Record<LimitName, Buckets>>();

/** Throws `rate-limited` when this client has used up its calls of that name. */
export function checkLimit(context: Context, name: LimitName, clientAddress: string): void {
  let buckets = bucketsOf.get(context);
  if (buckets === undefined) {
    buckets = {
      compute: createBuckets(limits.compute),
      session: createBuckets(limits.session),
      workshops: createBuckets(limits.workshops),
      meshes: createBuckets(limits.meshes),
    };
    bucketsOf.set(context, buckets);
  }
  const waitS = buckets[name].take(clientKey(clientAddress), context.clock.now().getTime());
  if (waitS === 0) return;
  const retryAfterS = Math.ceil(waitS);
  throw new DipwrightError(
    'rate-limited',
    `Too many calls from your address: try again in ${retryAfterS} s.`,
    {
      facts: { retryAfterS },
    },
  );
}

/** An IPv6 client holds a whole /64, so that is what is counted. */
function clientKey(address: string): string {
  if (!address.includes(':') || address.startsWith('::ffff:')) return address;
  const [head = '', tail] = address.split('::');
  const groups = head.split(':').filter((group) => group !== '');
  const after = tail === undefined ? [] : tail.split(':');
  const zeros = Array.from({ length: Math.max(0, 8 - groups.length - after.length) }, () => '0');
  return [...groups, ...zeros, ...after].slice(0, 4).join(':');
}
