import { invitationByLinkSchema } from '@/components/sharing/sharing-schema';
import { answerInvitation } from '@/lib/request/answer-invitation';
import { route } from '@/lib/request/route';

export const POST = route(
  { access: 'viewer', body: invitationByLinkSchema },
  ({ viewer, body: { token, answer } }) => answerInvitation(viewer, { token }, answer),
);
