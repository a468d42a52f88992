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

  /** Takes one token. @returns 0, or the milliseconds until there is one */
  return function take(key: number, now: number): number {
    const kept = buckets.get(key) ?? { tokens: capacity, at: now };
    const tokens = Math.min(capacity, kept.tokens + Math.max(0, now - kept.at) * perMs);
    buckets.set(key, { tokens: tokens >= 1 ? tokens - 1 : tokens, at: now });
    return tokens >= 1 ? 0 : Math.ceil((1 - tokens) / perMs);
  };
}
