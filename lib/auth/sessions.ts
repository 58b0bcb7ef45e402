import 'server-only';
import { DrizzlePostgreSQLAdapter } from '@lucia-auth/adapter-drizzle';
import { Lucia, TimeSpan } from 'lucia';
import { db } from '@/db/client';
import type { Viewer } from '@/db/queries/viewer';
import { sessions } from '@/db/schema/sessions';
import { users } from '@/db/schema/users';
import { hashSecret, makeSecret } from './secret';

const DAY_MS = 86_400_000;
const IDLE_DAYS = 14;
const REFRESH_DAYS = 1; // Lucia by itself moves the idle end only in its second half, and would end sessions after 7 idle days
export const ABSOLUTE_DAYS = 60;

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof makeLucia>;
    DatabaseSessionAttributes: { endsAt: Date; userAgent: string };
    DatabaseUserAttributes: typeof users.$inferSelect;
  }
}

const makeAdapter = () => new DrizzlePostgreSQLAdapter(db(), sessions, users);

function makeLucia() {
  return new Lucia(makeAdapter(), {
    sessionExpiresIn: new TimeSpan(IDLE_DAYS, 'd'),
    getSessionAttributes: ({ endsAt }) => ({ endsAt }),
    getUserAttributes: (user): Omit<Viewer, 'userId'> & { isAllowedIn: boolean } => ({
      email: user.email,
      displayName: user.displayName,
      isAdmin: user.isAdmin,
      isPatternMaker: user.isPatternMaker,
      isFitter: user.isFitter,
      unit: user.unit,
      words: user.words,
      hidesMeasurements: user.hidesMeasurements,
      isAllowedIn: user.emailVerifiedAt !== null && user.suspendedAt === null && user.deletedAt === null,
    }),
  });
}

let lucia: ReturnType<typeof makeLucia> | undefined;
const auth = () => (lucia ??= makeLucia());

/** A new session; the secret goes into the cookie and nowhere else. */
export async function beginSession(userId: string, userAgent: string, now: Date): Promise<string> {
  const secret = makeSecret();
  const endsAt = new Date(now.getTime() + ABSOLUTE_DAYS * DAY_MS);
  const attributes = { endsAt, userAgent: userAgent.slice(0, 200) };
  await auth().createSession(userId, attributes, { sessionId: hashSecret(secret) });
  return secret;
}

/** Whose session this is; null when it is unknown, has lain idle 14 days, is 60 days old, or its account may not come in. */
export async function viewerOfSecret(secret: string, now: Date): Promise<Viewer | null> {
  const { session, user } = await auth().validateSession(hashSecret(secret));
  if (!session) return null;
  if (session.endsAt <= now || !user.isAllowedIn) {
    await auth().invalidateSession(session.id);
    return null;
  }
  if (session.expiresAt.getTime() - now.getTime() < (IDLE_DAYS - REFRESH_DAYS) * DAY_MS) {
    await makeAdapter().updateSessionExpiration(session.id, new Date(now.getTime() + IDLE_DAYS * DAY_MS));
  }
  const { id: userId, isAllowedIn: _isAllowedIn, ...viewer } = user;
  return { userId, ...viewer };
}

export const endSession = (secret: string): Promise<void> => auth().invalidateSession(hashSecret(secret));
export const endAllSessions = (userId: string): Promise<void> => auth().invalidateUserSessions(userId);
