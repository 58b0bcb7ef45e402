import { z } from 'zod';
import { planSchema } from '@/components/round/round-schema';
import { planChange } from '@/db/queries/changes';
import { keepReading } from '@/db/queries/readings';
import { readAmount } from '@/lib/request/read-amount';
import { refusePastStop } from '@/lib/request/past-stop';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ roundId: z.uuid() }), body: planSchema },
  async ({ viewer, params, body: { id, amount, ...plan } }) => {
    const read = amount ? readAmount(amount, 'amount') : null;
    const planned = { ...plan, plannedMm: read?.mm ?? null, plannedTyped: read?.typed ?? null };
    await refusePastStop(viewer, { ...planned, roundId: params.roundId });
    const change = orNotFound(await planChange(viewer, params.roundId, id, planned));
    await keepReading(viewer, params.roundId);
    return change;
  },
);
