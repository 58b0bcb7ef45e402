import { z } from 'zod';
import { roundSchema } from '@/components/round/round-schema';
import { createRound } from '@/db/queries/rounds';
import { carryEvidence } from '@/lib/cut/carry-evidence';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ journalId: z.uuid() }), body: roundSchema },
  async ({ viewer, params, body: { id, ...round } }) => {
    const number = orNotFound(await createRound(viewer, params.journalId, id, round));
    // What the tape told belongs to the first wearing; later rounds keep their own evidence.
    if (number === 1) await carryEvidence(viewer, params.journalId, id);
    return { number };
  },
);
