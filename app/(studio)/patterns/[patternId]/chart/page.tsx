import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PatternTables } from '@/components/chart/PatternTables';
import { PageHead } from '@/components/ui/PageHead';
import { findPatternChart } from '@/db/queries/charts';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Size chart' };

export default async function ChartPage({ params }: PageProps<'/patterns/[patternId]/chart'>) {
  const viewer = await requireViewer();
  const id = uuidOr404((await params).patternId);
  const found = await findPatternChart(viewer, id);
  if (!found) notFound();
  return (
    <>
      <PageHead title="Size chart and measures" lead={`Of ${found.name}`} />
      <PatternTables patternId={id} cells={found.cells} unit={viewer.unit} />
    </>
  );
}
