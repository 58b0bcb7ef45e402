import { z } from 'zod';
import { evidenceSchema } from '@/components/round/round-schema';
import { saveEvidence } from '@/db/queries/evidence';
import { readAmount } from '@/lib/request/read-amount';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const PUT = route(
  { access: 'viewer', params: z.object({ roundId: z.uuid() }), body: evidenceSchema },
  async ({ viewer, params, body }) => {
    const checks = body.checks.map(({ amount, ...check }) => {
      const read = amount ? readAmount(amount, check.check) : null;
      return { ...check, amountMm: read?.mm ?? null, amountTyped: read?.typed ?? null };
    });
    return orNotFound(await saveEvidence(viewer, params.roundId, { ...body, checks }));
  },
);
