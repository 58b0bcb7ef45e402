import type { Metadata } from 'next';
import { ChangeAddressForm } from '@/components/account/OwnAccountForms';
import { PageHead } from '@/components/ui/PageHead';
import { requireViewer } from '@/lib/auth/viewer';
import { askForAddress } from './actions';

export const metadata: Metadata = { title: 'Change your address' };

export default async function AddressPage() {
  await requireViewer();
  return (
    <>
      <PageHead
        title="Change your address"
        lead="A letter with a link goes to the new one. Until the link is used, the old one stands."
      />
      <div className="max-w-md">
        <ChangeAddressForm action={askForAddress} />
      </div>
    </>
  );
}
