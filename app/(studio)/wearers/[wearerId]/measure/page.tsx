import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { sittingOf } from '@/components/measuring/last-sitting';
import { MeasureFlow } from '@/components/measuring/MeasureFlow';
import { PageHead } from '@/components/ui/PageHead';
import { listMeasurementSets } from '@/db/queries/measurements';
import { findWearer } from '@/db/queries/wearers';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Measure' };

const LEAD = 'From the waist down. Leave out what you cannot reach.';
const ASK_FIRST = 'Ask first: it is not written down yet that they agreed to be measured.';

export default async function MeasurePage({ params }: PageProps<'/wearers/[wearerId]/measure'>) {
  const viewer = await requireViewer();
  const id = uuidOr404((await params).wearerId);
  const [found, [last]] = await Promise.all([findWearer(viewer, id), listMeasurementSets(viewer, id)]);
  if (!found) notFound();
  const start = {
    measuredOn: new Date().toISOString().slice(0, 10),
    takenAlone: last?.takenAlone ?? found.isSelf,
    waistPlace: last?.waistPlace ?? ('narrowest' as const),
  };
  return (
    <>
      <PageHead
        title={`Measure ${found.name}`}
        lead={found.isSelf || found.consentsMeasure ? LEAD : ASK_FIRST}
      />
      <MeasureFlow
        wearerId={id}
        unit={viewer.unit}
        start={start}
        last={viewer.hidesMeasurements ? {} : sittingOf(last?.values ?? [], viewer.unit)}
      />
    </>
  );
}
