import 'server-only';
import { RateLimiterDrizzle, RateLimiterRes } from 'rate-limiter-flexible';
import { db } from '@/db/client';
import { rateLimits } from '@/db/schema/rate-limits';
import { hashSecret } from '@/lib/auth/secret';

const LIMITS = {
  'sign-in': { points: 5, durationS: 15 * 60 },
  mail: { points: 3, durationS: 3600 },
  // One household or classroom signs up from one address; thousands of strangers' mailboxes are not reached from it.
  'mail-from': { points: 60, durationS: 3600 },
  invite: { points: 30, durationS: 3600 },
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
 * Takes one point from each key's allowance, keys being kept as hashes; the counters are rows, so they outlive a restart and are shared by all processes.
 * @returns seconds to wait, or null when it may go on
 */
export async function takePoint(kind: LimitKind, keys: string[]): Promise<number | null> {
  for (const key of keys) {
    try {
      await limiterOf(kind).consume(hashSecret(key));
    } catch (thrown) {
      if (thrown instanceof RateLimiterRes) return Math.max(1, Math.ceil(thrown.msBeforeNext / 1000));
      throw thrown;
    }
  }
  return null;
}

/** For a letter to this mailbox, asked for from this client address. */
export async function takeMailPoint(email: string, address: string): Promise<number | null> {
  return (await takePoint('mail-from', [`address ${address}`])) ?? takePoint('mail', [`account ${email}`]);
}

/** After a success: the account's own counter starts again. */
export async function clearPoints(kind: LimitKind, key: string): Promise<void> {
  await limiterOf(kind).delete(hashSecret(key));
}

/** After a success: the one point goes back, and no more, so that signing in to an account of one's own buys no tries at others. */
export async function giveBack(kind: LimitKind, key: string): Promise<void> {
  await limiterOf(kind).reward(hashSecret(key), 1);
}
