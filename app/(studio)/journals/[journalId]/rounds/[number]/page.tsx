import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { MeasuredEvidence } from '@/components/cut/MeasuredEvidence';
import { RoundDesk } from '@/components/round/RoundDesk';
import { RoundHead } from '@/components/round/RoundHead';
import { findDesk } from '@/db/queries/desk';
import { listPhotos } from '@/db/queries/photos';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Round' };

export default async function RoundPage({ params }: PageProps<'/journals/[journalId]/rounds/[number]'>) {
  const viewer = await requireViewer();
  const { journalId, number } = await params;
  const desk = await findDesk(viewer, uuidOr404(journalId));
  const round = desk?.rounds.find((one) => String(one.number) === number);
  if (!desk || !round) notFound();
  const photos = await listPhotos(viewer, round.id);
  return (
    <>
      <RoundHead journalId={desk.journalId} name={desk.journalName} number={round.number} />
      <RoundDesk
        key={round.id}
        desk={desk}
        number={round.number}
        photos={photos}
        userId={viewer.userId}
        unit={viewer.unit}
      />
      <MeasuredEvidence measured={round.measured} unit={viewer.unit} isOwner={desk.isOwner} />
    </>
  );
}
