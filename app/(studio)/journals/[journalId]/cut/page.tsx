import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CutDesk } from '@/components/cut/CutDesk';
import { PageHead } from '@/components/ui/PageHead';
import { findCut } from '@/db/queries/cuts';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Before the first cut' };

export default async function CutPage({ params }: PageProps<'/journals/[journalId]/cut'>) {
  const viewer = await requireViewer();
  const dto = await findCut(viewer, uuidOr404((await params).journalId));
  if (!dto) notFound();
  return (
    <>
      <PageHead
        title="Before the first cut"
        lead={`${dto.journalName}, for ${dto.wearerName}, from ${dto.patternName}`}
      />
      <CutDesk dto={dto} unit={viewer.unit} isHidden={viewer.hidesMeasurements} />
    </>
  );
}
