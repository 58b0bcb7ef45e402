import { z } from 'zod';
import { wearerSchema } from '@/components/wearers/wearer-schema';
import { removeWearer, updateWearer } from '@/db/queries/wearers';
import { route } from '@/lib/request/route';
import { orNotFound, unwrap } from '@/lib/request/written';

const params = z.object({ wearerId: z.uuid() });

export const PATCH = route(
  { access: 'viewer', params, body: z.strictObject({ version: z.int().positive(), wearer: wearerSchema }) },
  async ({ viewer, params, body }) =>
    unwrap(await updateWearer(viewer, params.wearerId, body.version, body.wearer)),
);

export const DELETE = route({ access: 'viewer', params }, async ({ viewer, params }) => {
  orNotFound(await removeWearer(viewer, params.wearerId));
  return { removed: true };
});
