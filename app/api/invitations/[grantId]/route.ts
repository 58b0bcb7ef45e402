import { z } from 'zod';
import { invitationAnswerSchema } from '@/components/sharing/sharing-schema';
import { answerInvitation } from '@/lib/request/answer-invitation';
import { route } from '@/lib/request/route';

export const POST = route(
  { access: 'viewer', params: z.object({ grantId: z.uuid() }), body: invitationAnswerSchema },
  ({ viewer, params, body }) => answerInvitation(viewer, params, body.answer),
);
