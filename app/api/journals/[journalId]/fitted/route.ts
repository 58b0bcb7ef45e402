import { z } from 'zod';
import { fittedSchema } from '@/components/cut/cut-schema';
import { saveFitted } from '@/db/queries/fitted';
import { readAmount } from '@/lib/request/read-amount';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const PUT = route(
  { access: 'viewer', params: z.object({ journalId: z.uuid() }), body: fittedSchema },
  async ({ viewer, params, body: { unit, measures } }) => {
    const read = measures.map(({ measure, typed }) => {
      const { mm, typed: kept } = readAmount({ typed, unit }, measure);
      return { measure, valueMm: mm, typed: kept };
    });
    orNotFound(await saveFitted(viewer, params.journalId, read));
    return { kept: read.length };
  },
);
