import type { Metadata } from 'next';
import { CloseAccountForm } from '@/components/account/OwnAccountForms';
import { PageHead } from '@/components/ui/PageHead';
import { requireViewer } from '@/lib/auth/viewer';
import { closeAccount } from './actions';

export const metadata: Metadata = { title: 'Close your account' };

export default async function LeavePage() {
  await requireViewer();
  return (
    <>
      <PageHead
        title="Close your account"
        lead="Everything of yours is out of sight at once, also for those you opened it to, and is erased in 14 days. Signing in before then takes the account up again."
      />
      <div className="max-w-md">
        <CloseAccountForm action={closeAccount} />
      </div>
    </>
  );
}
