'use server';
import { redirect } from 'next/navigation';
import { tokenSchema } from '@/components/account/account-schema';
import { confirmEmailChange } from '@/db/queries/own-account';
import { formAction } from '@/lib/request/action';

export const confirmNewAddress = formAction(tokenSchema, async ({ token }) => {
  if (!(await confirmEmailChange(token)))
    return { message: 'This link was used already, or has run out. Your address is what it was.' };
  return redirect('/sign-in?confirmed=1');
});
