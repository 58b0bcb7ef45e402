import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CuttingSheet } from '@/components/cut/CuttingSheet';
import { PageHead } from '@/components/ui/PageHead';
import { findCut } from '@/db/queries/cuts';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Cutting and marking sheet' };

export default async function SheetPage({ params }: PageProps<'/journals/[journalId]/cut/sheet'>) {
  const viewer = await requireViewer();
  const dto = await findCut(viewer, uuidOr404((await params).journalId));
  if (!dto) notFound();
  return (
    <>
      <PageHead
        title="Cutting and marking sheet"
        lead={`${dto.journalName}, for ${dto.wearerName}, from ${dto.patternName}`}
      />
      <CuttingSheet dto={dto} unit={viewer.unit} />
    </>
  );
}
