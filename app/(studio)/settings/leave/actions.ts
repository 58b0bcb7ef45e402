'use server';
import { redirect } from 'next/navigation';
import { currentPasswordSchema } from '@/components/account/account-schema';
import { leaveRuckle } from '@/db/queries/own-account';
import { clearSessionCookie } from '@/lib/auth/cookie';
import { refuseUnlessThemselves } from '@/lib/auth/re-authenticate';
import { requireViewer } from '@/lib/auth/viewer';
import { formAction } from '@/lib/request/action';

export const closeAccount = formAction(currentPasswordSchema, async ({ current }) => {
  const viewer = await requireViewer();
  const refused = await refuseUnlessThemselves(viewer, current);
  if (refused) return refused;
  await leaveRuckle(viewer);
  await clearSessionCookie();
  return redirect('/');
});
