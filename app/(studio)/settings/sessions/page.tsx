import type { Metadata } from 'next';
import { SessionList } from '@/components/account/SessionList';
import { PageHead } from '@/components/ui/PageHead';
import { listSessions } from '@/db/queries/sessions';
import { readSessionCookie } from '@/lib/auth/cookie';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Where you are signed in' };

export default async function SessionsPage() {
  const viewer = await requireViewer();
  const sessions = await listSessions(viewer, (await readSessionCookie()) ?? '');
  return (
    <>
      <PageHead title="Where you are signed in" />
      <SessionList sessions={sessions} />
    </>
  );
}
