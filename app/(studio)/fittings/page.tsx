import type { Metadata } from 'next';
import { FittingList } from '@/components/sharing/FittingList';
import { WaitingInvitations } from '@/components/sharing/WaitingInvitations';
import { PageHead } from '@/components/ui/PageHead';
import { listFittings } from '@/db/queries/fittings';
import { listInvitations } from '@/db/queries/invitations';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Fittings for others' };

export default async function FittingsPage() {
  const viewer = await requireViewer();
  const [invitations, fittings] = await Promise.all([listInvitations(viewer), listFittings(viewer)]);
  return (
    <>
      <PageHead
        title="Fittings for others"
        lead="Rounds that were opened to you, and to nobody else by that."
      />
      <div className="grid gap-10">
        <WaitingInvitations invitations={invitations} />
        <FittingList fittings={fittings} />
      </div>
    </>
  );
}
