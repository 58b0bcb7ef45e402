import 'server-only';
import { lt, or, sql } from 'drizzle-orm';
import { db } from '../client';
import { rateLimits } from '../schema/rate-limits';
import { sessions } from '../schema/sessions';
import { tokens } from '../schema/tokens';

/** Takes away what has run out: sessions, links, counters. */
export async function sweepSessionsAndTokens(): Promise<void> {
  const now = sql`now()`;
  await db()
    .delete(sessions)
    .where(or(lt(sessions.expiresAt, now), lt(sessions.endsAt, now)));
  await db()
    .delete(tokens)
    .where(lt(tokens.expiresAt, sql`now() - interval '7 days'`));
  await db().delete(rateLimits).where(lt(rateLimits.expire, now));
}
