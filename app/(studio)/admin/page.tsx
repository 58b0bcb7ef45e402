import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { AdminPlaces } from '@/components/admin/AdminPlaces';
import { usersPageSchema } from '@/components/admin/admin-schema';
import { UserTable } from '@/components/admin/UserTable';
import { PageHead } from '@/components/ui/PageHead';
import { listUsers } from '@/db/queries/admin';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Accounts' };

export default async function AdminPage({ searchParams }: PageProps<'/admin'>) {
  const viewer = await requireViewer();
  const { before } = usersPageSchema.parse(await searchParams);
  const users = await listUsers(viewer, before);
  if (!users) notFound();
  return (
    <>
      <PageHead
        title="Accounts"
        lead="Nothing of what anyone records is shown here."
        actions={<AdminPlaces />}
      />
      <UserTable users={users} ownId={viewer.userId} />
    </>
  );
}
