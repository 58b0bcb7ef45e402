import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { LinkButton } from '@/components/ui/LinkButton';
import { PageHead } from '@/components/ui/PageHead';
import { Section } from '@/components/ui/Section';
import { MeasurementHistory } from '@/components/wearers/MeasurementHistory';
import { WearerEditor } from '@/components/wearers/WearerEditor';
import { listMeasurementSets } from '@/db/queries/measurements';
import { findWearer } from '@/db/queries/wearers';
import { requireViewer } from '@/lib/auth/viewer';
import { uuidOr404 } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'Wearer' };

export default async function WearerPage({ params }: PageProps<'/wearers/[wearerId]'>) {
  const viewer = await requireViewer();
  const id = uuidOr404((await params).wearerId);
  const [found, sets] = await Promise.all([findWearer(viewer, id), listMeasurementSets(viewer, id)]);
  if (!found) notFound();
  const { id: _id, version, ...wearer } = found;
  return (
    <>
      <PageHead title={found.name} />
      <div className="grid gap-10">
        <Section title="Measures">
          <MeasurementHistory sets={sets} unit={viewer.unit} isHidden={viewer.hidesMeasurements} />
          <div>
            <LinkButton look="chalk" href={`/wearers/${id}/measure`}>
              {sets.length === 0 ? 'Take the measures' : 'Measure again'}
            </LinkButton>
          </div>
        </Section>
        <Section title="Who it is">
          <WearerEditor existing={{ id, version, wearer }} />
        </Section>
      </div>
    </>
  );
}
