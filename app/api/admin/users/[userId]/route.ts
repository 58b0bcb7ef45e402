import { z } from 'zod';
import { userFlagsSchema } from '@/components/admin/admin-schema';
import { setUserFlags } from '@/db/queries/admin';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const PATCH = route(
  { access: 'viewer', params: z.object({ userId: z.uuid() }), body: userFlagsSchema },
  async ({ viewer, params, body }) => {
    orNotFound(await setUserFlags(viewer, params.userId, body));
    return { saved: true };
  },
);
