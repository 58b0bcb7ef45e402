import { z } from 'zod';
import { carryEvidence } from '@/lib/cut/carry-evidence';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

/** Takes the flat check of the round's journal into its reading. */
export const POST = route(
  {
    access: 'viewer',
    params: z.object({ roundId: z.uuid() }),
    body: z.strictObject({ journalId: z.uuid() }),
  },
  async ({ viewer, params, body }) => orNotFound(await carryEvidence(viewer, body.journalId, params.roundId)),
);
