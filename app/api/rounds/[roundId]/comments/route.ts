import { z } from 'zod';
import { commentSchema } from '@/components/conversation/conversation-schema';
import { addComment } from '@/db/queries/comments';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ roundId: z.uuid() }), body: commentSchema },
  async ({ viewer, params, body }) => orNotFound(await addComment(viewer, params.roundId, body)),
);
