import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { JournalActions } from '@/components/journal/JournalActions';
import { Ledger } from '@/components/journal/Ledger';
import { ledgerRows } from '@/components/journal/ledger-rows';
import { RoundTickets } from '@/components/journal/RoundTickets';
import { journalSettling } from '@/components/settling/journal-settling';
import { Settling } from '@/components/settling/Settling';
import { LinkButton } from '@/components/ui/LinkButton';
import { PageHead } from '@/components/ui/PageHead';
import { Section } from '@/components/ui/Section';
import { findDesk } from '@/db/queries/desk';
import { findJournal } from '@/db/queries/journals';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Journal' };

export default async function JournalPage({ params }: PageProps<'/journals/[journalId]'>) {
  const viewer = await requireViewer();
  const id = uuidOr404((await params).journalId);
  const [journal, desk] = await Promise.all([findJournal(viewer, id), findDesk(viewer, id)]);
  if (!journal) notFound();
  return (
    <>
      <PageHead
        title={journal.name}
        lead={`For ${journal.wearerName}, from ${journal.patternName}`}
        actions={<JournalActions journal={journal} />}
      />
      <div className="grid gap-10">
        <Section title="Rounds">
          <RoundTickets journalId={id} tickets={journal.tickets} />
        </Section>
        <Section title="The settling">
          <Settling {...journalSettling(desk)} />
        </Section>
        <Section title="The ledger">
          <Ledger rows={ledgerRows(journal.garment, desk?.rounds ?? [])} unit={viewer.unit} />
          {desk ? <LinkButton href={`/journals/${id}/record`}>The record, piece by piece</LinkButton> : null}
        </Section>
      </div>
    </>
  );
}
