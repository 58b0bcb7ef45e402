import { z } from 'zod';
import { BIN_KINDS, restoreFromBin } from '@/db/queries/bin-list';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

/** Takes it out of the bin, back to where it was. */
export const POST = route(
  { access: 'viewer', params: z.object({ kind: z.enum(BIN_KINDS), id: z.uuid() }) },
  async ({ viewer, params }) => {
    orNotFound(await restoreFromBin(viewer, params.kind, params.id));
    return { restored: true };
  },
);
