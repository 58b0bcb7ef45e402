'use server';
import { redirect } from 'next/navigation';
import { tokenSchema } from '@/components/account/account-schema';
import { verifyEmail } from '@/db/queries/accounts';
import { signInAs } from '@/lib/auth/sign-in';
import { formAction } from '@/lib/request/action';

export const confirmAddress = formAction(tokenSchema, async ({ token }, request) => {
  const userId = await verifyEmail(token);
  if (!userId)
    return { message: 'This link was used already, or has run out. Sign in, and a new one is sent.' };
  await signInAs(userId, request);
  return redirect('/journals');
});
