import { z } from 'zod';
import { revokeGrant } from '@/db/queries/sharing';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const DELETE = route(
  { access: 'viewer', params: z.object({ grantId: z.uuid() }) },
  async ({ viewer, params }) => {
    orNotFound(await revokeGrant(viewer, params.grantId));
    return { revoked: true };
  },
);
