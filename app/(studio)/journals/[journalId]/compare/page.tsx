import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { comparedRounds } from '@/components/compare/compared';
import { CompareView } from '@/components/compare/CompareView';
import { pairOf } from '@/components/compare/pair';
import { PhotoPairs } from '@/components/compare/PhotoPairs';
import { RoundChooser } from '@/components/compare/RoundChooser';
import { PageHead } from '@/components/ui/PageHead';
import { findDesk } from '@/db/queries/desk';
import { listMarkedPhotos } from '@/db/queries/marked-photos';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Side by side' };

export default async function ComparePage({
  params,
  searchParams,
}: PageProps<'/journals/[journalId]/compare'>) {
  const viewer = await requireViewer();
  const desk = await findDesk(viewer, uuidOr404((await params).journalId));
  const pair = desk && pairOf(desk.rounds, await searchParams);
  if (!pair) notFound();
  const { before, after } = pair;
  const photos = await listMarkedPhotos(viewer, [before.id, after.id]);
  const [was, is] = [before, after].map((round) => photos.filter(({ roundId }) => roundId === round.id));
  const compared = comparedRounds(
    desk,
    before,
    after,
    (is ?? []).map(({ view }) => view),
  );
  return (
    <div className="grid gap-8">
      <PageHead
        title={`Round ${before.number} and round ${after.number}`}
        lead={desk.journalName}
        actions={
          <RoundChooser
            numbers={desk.rounds.map(({ number }) => number)}
            a={before.number}
            b={after.number}
          />
        }
      />
      <PhotoPairs
        before={{ number: before.number, photos: was ?? [] }}
        after={{ number: after.number, photos: is ?? [] }}
      />
      <CompareView compared={compared} unit={viewer.unit} />
    </div>
  );
}
