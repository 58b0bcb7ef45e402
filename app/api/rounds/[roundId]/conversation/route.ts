import { z } from 'zod';
import { findConversation } from '@/db/queries/conversation';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const GET = route(
  { access: 'viewer', params: z.object({ roundId: z.uuid() }) },
  async ({ viewer, params }) => orNotFound(await findConversation(viewer, params.roundId)),
);
