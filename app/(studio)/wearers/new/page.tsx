import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/PageHead';
import { WearerEditor } from '@/components/wearers/WearerEditor';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Add a wearer' };

export default async function NewWearerPage() {
  await requireViewer();
  return (
    <>
      <PageHead title="Add a wearer" />
      <WearerEditor />
    </>
  );
}
