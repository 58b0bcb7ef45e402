import type { Metadata } from 'next';
import Link from 'next/link';
import { ownPath } from '@/components/account/account-schema';
import { AccountPage } from '@/components/account/AccountPage';
import { SignInForm } from '@/components/account/SignInForm';
import { signIn } from './actions';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const { next, confirmed } = await searchParams;
  const foot = (
    <span className="flex flex-wrap justify-between gap-4">
      <Link href="/sign-up" className="text-chalk underline">
        Make an account
      </Link>
      <Link href="/forgot" className="text-chalk underline">
        I forgot my password
      </Link>
    </span>
  );
  return (
    <AccountPage
      title="Sign in"
      lead={confirmed ? 'Your address is confirmed. Sign in with the password you chose.' : undefined}
      foot={foot}
    >
      <SignInForm action={signIn} next={ownPath(next)} />
    </AccountPage>
  );
}
