import { z } from 'zod';
import { findWaitingAddress, resendInvitation } from '@/db/queries/sharing';
import { takeInvitePoint } from '@/lib/request/invite';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ grantId: z.uuid() }) },
  async ({ viewer, params }) => {
    await takeInvitePoint(viewer, orNotFound(await findWaitingAddress(viewer, params.grantId)));
    orNotFound(await resendInvitation(viewer, params.grantId));
    return { sent: true };
  },
);
