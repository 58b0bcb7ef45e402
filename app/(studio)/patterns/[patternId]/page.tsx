import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PatternEditor } from '@/components/patterns/PatternEditor';
import { LinkButton } from '@/components/ui/LinkButton';
import { PageHead } from '@/components/ui/PageHead';
import { findPattern } from '@/db/queries/patterns';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Pattern' };

export default async function PatternPage({ params }: PageProps<'/patterns/[patternId]'>) {
  const viewer = await requireViewer();
  const found = await findPattern(viewer, uuidOr404((await params).patternId));
  if (!found) notFound();
  const { id, version, name, maker, clothKind, stretchPercent, notes } = found;
  return (
    <>
      <PageHead
        title={name}
        actions={<LinkButton href={`/patterns/${id}/chart`}>Size chart and measures</LinkButton>}
      />
      <PatternEditor existing={{ id, version, pattern: { name, maker, clothKind, stretchPercent, notes } }} />
    </>
  );
}
