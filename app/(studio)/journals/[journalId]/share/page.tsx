import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { GrantList } from '@/components/sharing/GrantList';
import { InviteForm } from '@/components/sharing/InviteForm';
import { PageHead } from '@/components/ui/PageHead';
import { Section } from '@/components/ui/Section';
import { findDesk } from '@/db/queries/desk';
import { findJournal } from '@/db/queries/journals';
import { listGrants } from '@/db/queries/sharing';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Who may look' };

export default async function SharePage({ params }: PageProps<'/journals/[journalId]/share'>) {
  const viewer = await requireViewer();
  const id = uuidOr404((await params).journalId);
  const reads = [findJournal(viewer, id), findDesk(viewer, id), listGrants(viewer, id)] as const;
  const [journal, desk, grants] = await Promise.all(reads);
  if (!journal?.isOwner) notFound();
  return (
    <>
      <PageHead title="Who may look" lead={journal.name} />
      <div className="grid gap-10">
        <Section title="Ask someone">
          <InviteForm
            journalId={id}
            rounds={(desk?.rounds ?? []).map((round) => ({ id: round.id, number: round.number }))}
          />
        </Section>
        <Section title="Opened to">
          <GrantList grants={grants} />
        </Section>
      </div>
    </>
  );
}
