import { z } from 'zod';
import { inviteSchema } from '@/components/sharing/sharing-schema';
import { inviteTo } from '@/lib/request/invite';
import { route } from '@/lib/request/route';

export const POST = route(
  { access: 'viewer', params: z.object({ roundId: z.uuid() }), body: inviteSchema },
  ({ viewer, params, body }) => inviteTo(viewer, params, body),
);
