import type { Metadata } from 'next';
import { ChangePasswordForm } from '@/components/account/OwnAccountForms';
import { PageHead } from '@/components/ui/PageHead';
import { requireViewer } from '@/lib/auth/viewer';
import { setPassword } from './actions';

export const metadata: Metadata = { title: 'Choose another password' };

export default async function PasswordPage() {
  await requireViewer();
  return (
    <>
      <PageHead title="Choose another password" lead="Every other session ends." />
      <div className="max-w-md">
        <ChangePasswordForm action={setPassword} />
      </div>
    </>
  );
}
