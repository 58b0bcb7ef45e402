import { z } from 'zod';
import { removeMeasured } from '@/db/queries/measured';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const DELETE = route(
  { access: 'viewer', params: z.object({ measuredId: z.uuid() }) },
  async ({ viewer, params }) => {
    orNotFound(await removeMeasured(viewer, params.measuredId));
    return { removed: true };
  },
);
