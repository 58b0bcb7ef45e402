import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { ComparedPair } from '@/components/compare/ComparedPair';
import { pairOf } from '@/components/compare/pair';
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
  const photos = await listMarkedPhotos(viewer, [pair.before.id, pair.after.id]);
  return <ComparedPair desk={desk} {...pair} photos={photos} unit={viewer.unit} />;
}
