import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { roundStartOf } from '@/components/round/round-start';
import { RoundStartForm } from '@/components/round/RoundStartForm';
import { PageHead } from '@/components/ui/PageHead';
import { findDesk } from '@/db/queries/desk';
import { findJournal } from '@/db/queries/journals';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Begin a round' };

export default async function NewRoundPage({ params }: PageProps<'/journals/[journalId]/rounds/new'>) {
  const viewer = await requireViewer();
  const id = uuidOr404((await params).journalId);
  const [journal, desk] = await Promise.all([findJournal(viewer, id), findDesk(viewer, id)]);
  if (!journal?.isOwner) notFound();
  const start = roundStartOf(journal.garment, desk?.rounds ?? []);
  const today = new Date().toISOString().slice(0, 10);
  return (
    <>
      <PageHead title={`Round ${start.number}`} lead={`${journal.name}, for ${journal.wearerName}`} />
      <RoundStartForm journalId={id} unit={viewer.unit} today={today} {...start} />
    </>
  );
}
