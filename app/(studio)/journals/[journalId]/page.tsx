import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { JournalActions } from '@/components/journal/JournalActions';
import { JournalParts } from '@/components/journal/JournalParts';
import { PageHead } from '@/components/ui/PageHead';
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
      <JournalParts journal={journal} desk={desk} unit={viewer.unit} />
    </>
  );
}
