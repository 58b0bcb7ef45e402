'use server';
import { signUpSchema } from '@/components/account/account-schema';
import { signUp as makeAccount } from '@/db/queries/accounts';
import { hashPassword } from '@/lib/auth/password';
import { takePoint } from '@/lib/limits/limit';
import { formAction } from '@/lib/request/action';
import { waitSentence } from '@/lib/request/wait-sentence';

export const signUp = formAction(signUpSchema, async ({ email, displayName, password }) => {
  const wait = await takePoint('mail', [`account ${email}`]);
  if (wait) return { message: waitSentence(wait) };
  await makeAccount({ email, displayName, passwordHash: await hashPassword(password) });
  return { isDone: true };
});
