import type { Metadata } from 'next';
import { BinList } from '@/components/bin/BinList';
import { PageHead } from '@/components/ui/PageHead';
import { BIN_DAYS, listBin } from '@/db/queries/bin-list';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Put away' };

export default async function BinPage() {
  const viewer = await requireViewer();
  const binned = await listBin(viewer);
  return (
    <>
      <PageHead
        title="Put away"
        lead={`Kept out of everyone’s sight for ${BIN_DAYS} days, then erased for good.`}
      />
      <BinList binned={binned} />
    </>
  );
}
