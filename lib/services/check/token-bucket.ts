import 'server-only';
import { LRUCache } from 'lru-cache';

type Bucket = { tokens: number; at: number };

/**
 * So many askings at once, refilled evenly over a minute, for each key. Kept in this process alone: a restart
 * fills every bucket, which is harmless for work that changes nothing.
 */
export function tokenBuckets({ capacity, perMinute }: { capacity: number; perMinute: number }) {
  const buckets = new LRUCache<number, Bucket>({ max: 10_000 });
  const perMs = perMinute / 60_000;

  /** Takes what one asking costs, at most the capacity. @returns 0, or the milliseconds until there is enough */
  return function take(key: number, now: number, cost = 1): number {
    const wanted = Math.min(cost, capacity);
    const kept = buckets.get(key) ?? { tokens: capacity, at: now };
    const tokens = Math.min(capacity, kept.tokens + Math.max(0, now - kept.at) * perMs);
    const isEnough = tokens >= wanted;
    buckets.set(key, { tokens: isEnough ? tokens - wanted : tokens, at: now });
    return isEnough ? 0 : Math.ceil((wanted - tokens) / perMs);
  };
}
