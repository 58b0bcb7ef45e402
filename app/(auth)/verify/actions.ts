'use server';
import { redirect } from 'next/navigation';
import { tokenSchema } from '@/components/account/account-schema';
import { verifyEmail } from '@/db/queries/accounts';
import { signInAs } from '@/lib/auth/sign-in';
import { isMarkedSignUp } from '@/lib/auth/sign-up-mark';
import { formAction } from '@/lib/request/action';

export const confirmAddress = formAction(tokenSchema, async ({ token }, request) => {
  const account = await verifyEmail(token);
  if (!account)
    return { message: 'This link was used already, or has run out. Sign in, and a new one is sent.' };
  if (!(await isMarkedSignUp(account.passwordHash))) return redirect('/sign-in?confirmed=1');
  await signInAs(account.userId, request);
  return redirect('/journals');
});
