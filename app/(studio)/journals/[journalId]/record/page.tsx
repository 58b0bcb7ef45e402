import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PatternRecord } from '@/components/record/PatternRecord';
import { findDesk } from '@/db/queries/desk';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'The record' };

export default async function RecordPage({ params }: PageProps<'/journals/[journalId]/record'>) {
  const viewer = await requireViewer();
  const desk = await findDesk(viewer, uuidOr404((await params).journalId));
  if (!desk) notFound();
  return <PatternRecord desk={desk} unit={viewer.unit} />;
}
