import { z } from 'zod';
import { proposalSchema } from '@/components/conversation/conversation-schema';
import { propose } from '@/db/queries/proposals';
import { readAmount } from '@/lib/request/read-amount';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ roundId: z.uuid() }), body: proposalSchema },
  async ({ viewer, params, body: { changes, ...proposal } }) => {
    const read = changes.map(({ amount, ...change }) => {
      const length = amount ? readAmount(amount, 'amount') : null;
      return { ...change, plannedMm: length?.mm ?? null, plannedTyped: length?.typed ?? null };
    });
    orNotFound(await propose(viewer, params.roundId, { ...proposal, changes: read }));
    return { proposed: true };
  },
);
