import type { Metadata } from 'next';
import { NewGarmentForm } from '@/components/journals/NewGarmentForm';
import { PageHead } from '@/components/ui/PageHead';
import { listPatterns } from '@/db/queries/patterns';
import { listWearers } from '@/db/queries/wearers';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'A new garment' };

export default async function NewJournalPage() {
  const viewer = await requireViewer();
  const [wearers, patterns] = await Promise.all([listWearers(viewer), listPatterns(viewer)]);
  return (
    <>
      <PageHead title="A new garment" lead="One garment, one person, one draft: that is a journal." />
      <NewGarmentForm
        wearers={wearers.map(({ id, name }) => ({ id, name }))}
        patterns={patterns.map(({ draftId, name }) => ({ draftId, name }))}
      />
    </>
  );
}
