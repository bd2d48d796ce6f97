/** Token buckets by key. */
export interface Buckets {
  /** Takes one token; 0 when there was one, else the seconds until there is. */
  take(key: string, nowMs: number): number;
}

const mostKeys = 10_000;

/** Kept in memory: a restart fills them all, which is harmless. */
export function createBuckets(rate: { burst: number; perSecond: number }): Buckets {
  const buckets = new Map<string, { tokens: number; atMs: number }>();
  return {
    take(key, nowMs) {
      const kept = buckets.get(key);
      const passedS = kept === undefined ? 0 : Math.max(0, nowMs - kept.atMs) / 1000;
      const tokens = Math.min(rate.burst, (kept?.tokens ?? rate.burst) + passedS * rate.perSecond);
      buckets.delete(key);
      // a Map keeps its order of insertion: the first is the one longest unused
      if (buckets.size >= mostKeys) buckets.delete(buckets.keys().next().value!);
      buckets.set(key, { tokens: tokens >= 1 ? tokens - 1 : tokens, atMs: nowMs });
      return tokens >= 1 ? 0 : (1 - tokens) / rate.perSecond;
    },
  };
}
