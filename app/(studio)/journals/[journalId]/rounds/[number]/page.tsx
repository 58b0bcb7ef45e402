import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { RoundDesk } from '@/components/round/RoundDesk';
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
      <div className="mb-5">
        <Link
          href={`/journals/${desk.journalId}`}
          className="inline-flex min-h-11 items-center text-chalk underline"
        >
          {desk.journalName}
        </Link>
        <h1 className="text-2xl">Round {round.number}</h1>
      </div>
      <RoundDesk
        key={round.id}
        desk={desk}
        number={round.number}
        photos={photos}
        userId={viewer.userId}
        unit={viewer.unit}
      />
    </>
  );
}
