import type { Metadata } from 'next';
import { AccountPage } from '@/components/account/AccountPage';
import { ForgotForm } from '@/components/account/TokenForms';
import { sendReset } from './actions';

export const metadata: Metadata = { title: 'A new password' };

export default function ForgotPage() {
  return (
    <AccountPage title="A new password" lead="We send a link to your address.">
      <ForgotForm action={sendReset} />
    </AccountPage>
  );
}
