'use server';
import { redirect } from 'next/navigation';
import { changePasswordSchema } from '@/components/account/account-schema';
import { changePassword } from '@/db/queries/own-account';
import { hashPassword } from '@/lib/auth/password';
import { refuseUnlessThemselves } from '@/lib/auth/re-authenticate';
import { signInAs } from '@/lib/auth/sign-in';
import { requireViewer } from '@/lib/auth/viewer';
import { formAction } from '@/lib/request/action';

export const setPassword = formAction(changePasswordSchema, async ({ current, password }, request) => {
  const viewer = await requireViewer();
  const refused = await refuseUnlessThemselves(viewer, current);
  if (refused) return refused;
  await changePassword(viewer, await hashPassword(password));
  await signInAs(viewer.userId, request);
  return redirect('/settings');
});
