'use server';
import { redirect } from 'next/navigation';
import type { Route } from 'next';
import { ownPath, signInSchema } from '@/components/account/account-schema';
import { findForSignIn, resendVerification } from '@/db/queries/accounts';
import { comeBack } from '@/db/queries/own-account';
import { verifyPassword } from '@/lib/auth/password';
import { signInAs } from '@/lib/auth/sign-in';
import { clearPoints, giveBack, takePoint } from '@/lib/limits/limit';
import { formAction } from '@/lib/request/action';
import { clientAddress } from '@/lib/request/client-address';
import { waitSentence } from '@/lib/request/wait-sentence';

export const signIn = formAction(signInSchema, async ({ email, password, next }, request) => {
  const [byAccount, byAddress] = [`account ${email}`, `address ${clientAddress(request)}`];
  const wait = await takePoint('sign-in', [byAddress, byAccount]);
  if (wait) return { message: waitSentence(wait) };
  const account = await findForSignIn(email);
  const isRight = await verifyPassword(account?.passwordHash ?? null, password);
  if (!account || !isRight)
    return { message: 'Address and password do not go together. Nothing was changed.' };
  if (account.isSuspended)
    return { message: 'This account is closed just now. Write to whoever runs this site.' };
  if (!account.isVerified) {
    if (!(await takePoint('mail', [`account ${email}`]))) await resendVerification(account);
    return { message: 'Your address is not confirmed yet. A new link is on its way to it.' };
  }
  if (account.isLeaving) await comeBack(account.userId);
  await Promise.all([clearPoints('sign-in', byAccount), giveBack('sign-in', byAddress)]);
  await signInAs(account.userId, request);
  return redirect(ownPath(next) as Route);
});
