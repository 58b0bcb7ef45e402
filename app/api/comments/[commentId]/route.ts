import { z } from 'zod';
import { commentEditSchema } from '@/components/conversation/conversation-schema';
import { editComment, removeComment } from '@/db/queries/comments';
import { route } from '@/lib/request/route';
import { orNotFound, unwrap } from '@/lib/request/written';

const params = z.object({ commentId: z.uuid() });

export const PATCH = route(
  { access: 'viewer', params, body: commentEditSchema },
  async ({ viewer, params, body }) =>
    unwrap(await editComment(viewer, params.commentId, body.version, body.body)),
);

export const DELETE = route({ access: 'viewer', params }, async ({ viewer, params }) => {
  orNotFound(await removeComment(viewer, params.commentId));
  return { removed: true };
});
