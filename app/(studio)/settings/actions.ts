'use server';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { auditSession } from '@/db/queries/accounts';
import { clearSessionCookie, readSessionCookie } from '@/lib/auth/cookie';
import { endSession } from '@/lib/auth/sessions';
import { currentViewer } from '@/lib/auth/viewer';
import { formAction } from '@/lib/request/action';

export const signOut = formAction(z.object({}), async () => {
  const viewer = await currentViewer();
  const secret = await readSessionCookie();
  if (secret) await endSession(secret);
  await clearSessionCookie();
  if (viewer) await auditSession(viewer.userId, 'sign-out');
  return redirect('/');
});
