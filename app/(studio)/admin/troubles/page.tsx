import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { AdminPlaces } from '@/components/admin/AdminPlaces';
import { Troubles } from '@/components/admin/Troubles';
import { PageHead } from '@/components/ui/PageHead';
import { listTroubles } from '@/db/queries/admin';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Letters and jobs' };

export default async function TroublesPage() {
  const viewer = await requireViewer();
  const troubles = await listTroubles(viewer);
  if (!troubles) notFound();
  return (
    <>
      <PageHead title="Letters and jobs" lead="What did not go through." actions={<AdminPlaces />} />
      <Troubles {...troubles} />
    </>
  );
}
