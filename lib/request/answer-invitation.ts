import 'server-only';
import { acceptInvitation, declineInvitation, type InvitationKey } from '@/db/queries/invitations';
import type { Viewer } from '@/db/queries/viewer';
import { orNotFound } from './written';

/** Yes, no, or no to every later one too. To any account but the invited one there is nothing to answer. */
export async function answerInvitation(
  viewer: Viewer,
  key: InvitationKey,
  answer: 'accept' | 'decline' | 'block',
): Promise<{ path: string }> {
  if (answer !== 'accept') {
    orNotFound(await declineInvitation(viewer, key, answer === 'block'));
    return { path: '/fittings' };
  }
  const { journalId, roundNumber } = orNotFound(await acceptInvitation(viewer, key));
  return { path: `/journals/${journalId}${roundNumber === null ? '' : `/rounds/${roundNumber}`}` };
}
