import { v7 } from 'uuid';
import { acceptInvitation } from '@/db/queries/invitations';
import { invite, type ShareTarget } from '@/db/queries/sharing';
import type { Viewer } from '@/db/queries/viewer';

/** Invites someone, without their answer yet; the id of the invitation. */
export async function invitationTo(
  owner: Viewer,
  target: ShareTarget,
  to: Viewer,
  level: 'read' | 'fit' = 'fit',
): Promise<string> {
  const id = v7();
  const ending = await invite(owner, target, { id, email: to.email, level, expiresInDays: 30 });
  if (ending !== 'invited') throw new Error(`not invited: ${ending}`);
  return id;
}

/** Invites someone who says yes at once. */
export async function openTo(owner: Viewer, target: ShareTarget, to: Viewer, level: 'read' | 'fit' = 'fit') {
  const grantId = await invitationTo(owner, target, to, level);
  if (!(await acceptInvitation(to, { grantId }))) throw new Error('not accepted');
  return grantId;
}
