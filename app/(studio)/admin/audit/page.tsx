import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { AdminPlaces } from '@/components/admin/AdminPlaces';
import { auditFilterSchema } from '@/components/admin/admin-schema';
import { AuditTable } from '@/components/admin/AuditTable';
import { PageHead } from '@/components/ui/PageHead';
import { listAudit } from '@/db/queries/admin';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Audit' };

export default async function AuditPage({ searchParams }: PageProps<'/admin/audit'>) {
  const viewer = await requireViewer();
  const filter = auditFilterSchema.parse(await searchParams);
  const entries = await listAudit(viewer, filter);
  if (!entries) notFound();
  return (
    <>
      <PageHead
        title="Audit"
        lead="Who did what to which thing, never what was written."
        actions={<AdminPlaces />}
      />
      <AuditTable entries={entries} filter={filter} />
    </>
  );
}
