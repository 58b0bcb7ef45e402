import { z } from 'zod';
import { wearerSchema } from '@/components/wearers/wearer-schema';
import { createWearer, listWearers } from '@/db/queries/wearers';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const GET = route({ access: 'viewer' }, ({ viewer }) => listWearers(viewer));

export const POST = route(
  { access: 'viewer', body: z.strictObject({ id: z.uuid(), wearer: wearerSchema }) },
  async ({ viewer, body }) => orNotFound(await createWearer(viewer, body.id, body.wearer)),
);
