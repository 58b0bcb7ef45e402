import { z } from 'zod';
import { endSessions } from '@/db/queries/sessions';
import { readSessionCookie } from '@/lib/auth/cookie';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

const which = z.union([z.literal('others'), z.string().regex(/^[0-9a-f]{64}$/)]);

export const DELETE = route({ access: 'viewer', params: z.object({ which }) }, async ({ viewer, params }) => {
  orNotFound(await endSessions(viewer, (await readSessionCookie()) ?? '', params.which));
  return { ended: true };
});
