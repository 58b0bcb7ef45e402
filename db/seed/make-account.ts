import { eq } from 'drizzle-orm';
import { v7 } from 'uuid';
import { hashPassword } from '@/lib/auth/password';
import { db } from '../client';
import type { Viewer } from '../queries/viewer';
import { users } from '../schema/users';

interface DemoAccount {
  email: string;
  password: string;
  name: string;
  unit: string;
}

/** An account whose address needs no letter: it is nobody's. */
export async function makeDemoAccount({ email, password, name, unit }: DemoAccount): Promise<Viewer> {
  const id = v7();
  const own = {
    email,
    displayName: name,
    unit: unit === 'in' ? ('in' as const) : ('cm' as const),
    isFitter: unit === 'in',
  };
  // What an earlier, broken seeding left of this invented person goes first.
  await db().delete(users).where(eq(users.email, email));
  await db()
    .insert(users)
    .values({ id, ...own, passwordHash: await hashPassword(password), emailVerifiedAt: new Date() });
  return { userId: id, ...own, isAdmin: false, isPatternMaker: false, words: 'uk', hidesMeasurements: false };
}
