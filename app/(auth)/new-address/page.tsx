import type { Metadata } from 'next';
import { AccountPage } from '@/components/account/AccountPage';
import { ConfirmForm } from '@/components/account/TokenForms';
import { confirmNewAddress } from './actions';

export const metadata: Metadata = { title: 'Confirm your new address' };

export default async function NewAddressPage({ searchParams }: PageProps<'/new-address'>) {
  const { token } = await searchParams;
  return (
    <AccountPage title="Confirm your new address" lead="One press, and you sign in with it from then on.">
      <ConfirmForm action={confirmNewAddress} token={typeof token === 'string' ? token : ''} />
    </AccountPage>
  );
}
