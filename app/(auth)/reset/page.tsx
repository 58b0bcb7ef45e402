import type { Metadata } from 'next';
import { AccountPage } from '@/components/account/AccountPage';
import { ResetForm } from '@/components/account/TokenForms';
import { choosePassword } from './actions';

export const metadata: Metadata = { title: 'Choose a new password' };

export default async function ResetPage({ searchParams }: PageProps<'/reset'>) {
  const { token } = await searchParams;
  return (
    <AccountPage title="Choose a new password" lead="Every other session ends.">
      <ResetForm action={choosePassword} token={typeof token === 'string' ? token : ''} />
    </AccountPage>
  );
}
