import 'server-only';
import { and, eq, gt, isNull, sql } from 'drizzle-orm';
import { hashSecret, makeSecret } from '@/lib/auth/secret';
import type { Executor } from '../client';
import { tokens } from '../schema/tokens';

const MINUTES = { 'verify-email': 24 * 60, 'reset-password': 30, 'change-email': 24 * 60 } as const;
export type TokenKind = keyof typeof MINUTES;
export const isTokenKind = (kind: string): kind is TokenKind => kind in MINUTES;

/** Whatever links of this kind are out are void from now on. */
export async function voidTokens(tx: Executor, userId: string, kind: TokenKind): Promise<void> {
  await tx
    .update(tokens)
    .set({ usedAt: sql`now()` })
    .where(and(eq(tokens.userId, userId), eq(tokens.kind, kind), isNull(tokens.usedAt)));
}

/**
 * A link's secret for one purpose. It is made when the letter is sent, never before: until then nothing that could be used
 * stands anywhere, and a letter that was held up does not arrive run out.
 */
export async function issueToken(
  tx: Executor,
  userId: string,
  kind: TokenKind,
  email: string,
): Promise<string> {
  const secret = makeSecret();
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
  if (!row) return null;
  await voidTokens(tx, row.userId, kind); // a letter sent twice after a crash carries two: one use ends both
  return row;
}
