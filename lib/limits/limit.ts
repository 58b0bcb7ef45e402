import 'server-only';
import { RateLimiterDrizzle, RateLimiterRes } from 'rate-limiter-flexible';
import { db } from '@/db/client';
import { rateLimits } from '@/db/schema/rate-limits';

const LIMITS = {
  'sign-in': { points: 5, durationS: 15 * 60 },
  mail: { points: 3, durationS: 3600 },
  upload: { points: 60, durationS: 3600 },
} as const;

export type LimitKind = keyof typeof LIMITS;

const limiters = new Map<LimitKind, RateLimiterDrizzle>();

function limiterOf(kind: LimitKind): RateLimiterDrizzle {
  const had = limiters.get(kind);
  if (had) return had;
  const { points, durationS } = LIMITS[kind];
  const made = new RateLimiterDrizzle({
    storeClient: db(),
    schema: rateLimits,
    keyPrefix: kind,
    points,
    duration: durationS,
  });
  limiters.set(kind, made);
  return made;
}

/**
 * Takes one point from each key's allowance; the counters are rows, so they outlive a restart and are shared by all processes.
 * @returns seconds to wait, or null when it may go on
 */
export async function takePoint(kind: LimitKind, keys: string[]): Promise<number | null> {
  for (const key of keys) {
    try {
      await limiterOf(kind).consume(key);
    } catch (thrown) {
      if (thrown instanceof RateLimiterRes) return Math.max(1, Math.ceil(thrown.msBeforeNext / 1000));
      throw thrown;
    }
  }
  return null;
}

/** After a success the account's own counter starts again. */
export async function giveBack(kind: LimitKind, key: string): Promise<void> {
  await limiterOf(kind).delete(key);
}
