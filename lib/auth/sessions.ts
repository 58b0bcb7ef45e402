import 'server-only';
import { DrizzlePostgreSQLAdapter } from '@lucia-auth/adapter-drizzle';
import { Lucia, TimeSpan } from 'lucia';
import { db } from '@/db/client';
import type { Viewer } from '@/db/queries/viewer';
import { sessions } from '@/db/schema/sessions';
import { users } from '@/db/schema/users';
import { hashSecret, makeSecret } from './secret';

const IDLE_DAYS = 14;
export const ABSOLUTE_DAYS = 60;

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof makeLucia>;
    DatabaseSessionAttributes: { endsAt: Date; userAgent: string };
    DatabaseUserAttributes: typeof users.$inferSelect;
  }
}

function makeLucia() {
  return new Lucia(new DrizzlePostgreSQLAdapter(db(), sessions, users), {
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
  const endsAt = new Date(now.getTime() + ABSOLUTE_DAYS * 86_400_000);
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
  const { id: userId, isAllowedIn: _isAllowedIn, ...viewer } = user;
  return { userId, ...viewer };
}

export const endSession = (secret: string): Promise<void> => auth().invalidateSession(hashSecret(secret));
export const endAllSessions = (userId: string): Promise<void> => auth().invalidateUserSessions(userId);
