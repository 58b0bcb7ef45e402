'use server';
import { signUpSchema } from '@/components/account/account-schema';
import { signUp as makeAccount } from '@/db/queries/accounts';
import { hashPassword } from '@/lib/auth/password';
import { markSignUp } from '@/lib/auth/sign-up-mark';
import { takeMailPoint } from '@/lib/limits/limit';
import { formAction } from '@/lib/request/action';
import { clientAddress } from '@/lib/request/client-address';
import { inEvenTime } from '@/lib/request/even-time';
import { waitSentence } from '@/lib/request/wait-sentence';

const EVEN_MS = 150;

export const signUp = formAction(signUpSchema, async ({ email, displayName, password }, request) => {
  const wait = await takeMailPoint(email, clientAddress(request));
  if (wait) return { message: waitSentence(wait) };
  const passwordHash = await hashPassword(password);
  await inEvenTime(EVEN_MS, () => makeAccount({ email, displayName, passwordHash }));
  await markSignUp(passwordHash);
  return { isDone: true };
});
