import { z } from 'zod';
import { proposalAnswerSchema } from '@/components/conversation/conversation-schema';
import { answerProposal } from '@/db/queries/proposals';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ proposalId: z.uuid() }), body: proposalAnswerSchema },
  async ({ viewer, params, body }) => ({
    taken: orNotFound(await answerProposal(viewer, params.proposalId, body.taken)),
  }),
);
