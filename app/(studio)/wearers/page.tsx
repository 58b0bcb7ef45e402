import type { Metadata } from 'next';
import { EmptyState } from '@/components/ui/EmptyState';
import { LinkButton } from '@/components/ui/LinkButton';
import { PageHead } from '@/components/ui/PageHead';
import { PlainList } from '@/components/ui/PlainList';
import { listWearers } from '@/db/queries/wearers';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Wearers' };

export default async function WearersPage() {
  const viewer = await requireViewer();
  const wearers = await listWearers(viewer);
  const add = <LinkButton href="/wearers/new">Add a wearer</LinkButton>;
  return (
    <>
      <PageHead
        title="Wearers"
        lead="The people you sew for, yourself among them."
        actions={wearers.length > 0 && add}
      />
      {wearers.length === 0 ? (
        <EmptyState title="Nobody yet" action={add}>
          <p>Every garment is fitted to one person. Add yourself, or someone who has agreed to it.</p>
        </EmptyState>
      ) : (
        <PlainList
          items={wearers.map(({ id, name, isSelf }) => ({
            id,
            href: `/wearers/${id}` as const,
            title: name,
            note: isSelf ? 'Yourself' : '',
          }))}
        />
      )}
    </>
  );
}
