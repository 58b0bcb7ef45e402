import type { Metadata } from 'next';
import Link from 'next/link';
import { AccountPage } from '@/components/account/AccountPage';
import { SignUpForm } from '@/components/account/SignUpForm';
import { signUp } from './actions';

export const metadata: Metadata = { title: 'Make an account' };

export default function SignUpPage() {
  const foot = (
    <Link href="/sign-in" className="text-chalk underline">
      I have an account
    </Link>
  );
  return (
    <AccountPage
      title="Make an account"
      lead="Everything you keep here is yours alone until you share it by name."
      foot={foot}
    >
      <SignUpForm action={signUp} />
    </AccountPage>
  );
}
