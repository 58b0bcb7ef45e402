import 'server-only';
import { and, eq, gt, isNull, sql } from 'drizzle-orm';
import { hashSecret, makeSecret } from '@/lib/auth/secret';
import type { Executor } from '../client';
import { tokens } from '../schema/tokens';

const MINUTES = { 'verify-email': 24 * 60, 'reset-password': 30, 'change-email': 24 * 60 } as const;
type TokenKind = keyof typeof MINUTES;

/** A link's secret for one purpose; the one before of the same kind is void from now on. */
export async function issueToken(
  tx: Executor,
  userId: string,
  kind: TokenKind,
  email: string,
): Promise<string> {
  const secret = makeSecret();
  await tx.delete(tokens).where(and(eq(tokens.userId, userId), eq(tokens.kind, kind)));
  await tx.insert(tokens).values({
    userId,
    kind,
    email,
    tokenHash: hashSecret(secret),
    expiresAt: sql`now() + make_interval(mins => ${MINUTES[kind]})`,
  });
  return secret;
}

/** Uses a link up. Null when it is unknown, was used, or has run out: the three are not told apart. */
export async function consumeToken(
  tx: Executor,
  secret: string,
  kind: TokenKind,
): Promise<{ userId: string; email: string } | null> {
  const [row] = await tx
    .update(tokens)
    .set({ usedAt: sql`now()` })
    .where(
      and(
        eq(tokens.tokenHash, hashSecret(secret)),
        eq(tokens.kind, kind),
        isNull(tokens.usedAt),
        gt(tokens.expiresAt, sql`now()`),
      ),
    )
    .returning({ userId: tokens.userId, email: tokens.email });
  return row ?? null;
}
