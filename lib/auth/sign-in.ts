import 'server-only';
import { auditSession } from '@/db/queries/accounts';
import { readSessionCookie, writeSessionCookie } from './cookie';
import { beginSession, endSession } from './sessions';

/** A fresh session at every sign-in; one that the browser brought along is ended. */
export async function signInAs(userId: string, headers: Headers): Promise<void> {
  const before = await readSessionCookie();
  if (before) await endSession(before);
  await writeSessionCookie(await beginSession(userId, headers.get('user-agent') ?? '', new Date()));
  await auditSession(userId, 'sign-in');
}
