import type { Metadata } from 'next';
import { AccountPage } from '@/components/account/AccountPage';
import { ConfirmForm } from '@/components/account/TokenForms';
import { confirmAddress } from './actions';

export const metadata: Metadata = { title: 'Confirm your address' };

export default async function VerifyPage({ searchParams }: PageProps<'/verify'>) {
  const { token } = await searchParams;
  return (
    <AccountPage title="Confirm your address" lead="One press, and your account is open.">
      <ConfirmForm action={confirmAddress} token={typeof token === 'string' ? token : ''} />
    </AccountPage>
  );
}
