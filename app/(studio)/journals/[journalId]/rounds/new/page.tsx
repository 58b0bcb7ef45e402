import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { muslinFrom } from '@/components/cut/muslin-start';
import { roundStartOf } from '@/components/round/round-start';
import { RoundStartForm } from '@/components/round/RoundStartForm';
import { LinkButton } from '@/components/ui/LinkButton';
import { PageHead } from '@/components/ui/PageHead';
import { findCut } from '@/db/queries/cuts';
import { findDesk } from '@/db/queries/desk';
import { findJournal } from '@/db/queries/journals';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Begin a round' };

export default async function NewRoundPage({ params }: PageProps<'/journals/[journalId]/rounds/new'>) {
  const viewer = await requireViewer();
  const id = uuidOr404((await params).journalId);
  const found = await Promise.all([findJournal(viewer, id), findDesk(viewer, id), findCut(viewer, id)]);
  const [journal, desk, cut] = found;
  if (!journal?.isOwner || !cut) notFound();
  const start = roundStartOf(journal.garment, desk?.rounds ?? []);
  const muslin = start.isFirst ? muslinFrom(cut, start.muslin) : start.muslin;
  const today = new Date().toISOString().slice(0, 10);
  return (
    <>
      <PageHead
        title={`Round ${start.number}`}
        lead={`${journal.name}, for ${journal.wearerName}`}
        actions={start.isFirst && <LinkButton href={`/journals/${id}/cut`}>Before the first cut</LinkButton>}
      />
      <RoundStartForm journalId={id} unit={viewer.unit} today={today} {...start} muslin={muslin} />
    </>
  );
}
