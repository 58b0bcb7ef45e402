import type { Metadata } from 'next';
import { AccountPage } from '@/components/account/AccountPage';
import { InvitationView } from '@/components/sharing/InvitationView';
import { findInvitation } from '@/db/queries/invitations';
import { currentViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'An invitation', referrer: 'no-referrer' };

export default async function InvitationPage({ searchParams }: PageProps<'/invitation'>) {
  const { token } = await searchParams;
  const secret = typeof token === 'string' ? token : '';
  const [viewer, invitation] = await Promise.all([currentViewer(), findInvitation(secret)]);
  return (
    <AccountPage title="An invitation">
      <InvitationView token={secret} invitation={invitation} email={viewer?.email ?? null} />
    </AccountPage>
  );
}
