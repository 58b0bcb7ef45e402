import { z } from 'zod';
import { roundSchema } from '@/components/round/round-schema';
import { createRound } from '@/db/queries/rounds';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ journalId: z.uuid() }), body: roundSchema },
  async ({ viewer, params, body: { id, ...round } }) => ({
    number: orNotFound(await createRound(viewer, params.journalId, id, round)),
  }),
);
