'use server';
import { redirect } from 'next/navigation';
import { resetSchema } from '@/components/account/account-schema';
import { resetPassword } from '@/db/queries/accounts';
import { hashPassword } from '@/lib/auth/password';
import { signInAs } from '@/lib/auth/sign-in';
import { formAction } from '@/lib/request/action';

export const choosePassword = formAction(resetSchema, async ({ token, password }, request) => {
  const userId = await resetPassword(token, await hashPassword(password));
  if (!userId) return { message: 'This link was used already, or has run out. Ask for a new one.' };
  await signInAs(userId, request);
  return redirect('/journals');
});
