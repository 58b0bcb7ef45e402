import { z } from 'zod';
import { cutSchema } from '@/components/cut/cut-schema';
import { saveCut } from '@/db/queries/cuts';
import { readLengths } from '@/lib/cut/read-lengths';
import { route } from '@/lib/request/route';
import { unwrap } from '@/lib/request/written';

export const PATCH = route(
  { access: 'viewer', params: z.object({ journalId: z.uuid() }), body: cutSchema },
  async ({ viewer, params, body: { version, ease, gauge, sizes, ...rest } }) =>
    unwrap(
      await saveCut(viewer, params.journalId, version, {
        ...rest,
        ...(sizes ? { sizes } : {}),
        ...(ease ? { ease: readLengths(ease) } : {}),
        ...(gauge ? { gauge: readLengths(gauge) } : {}),
      }),
    ),
);
