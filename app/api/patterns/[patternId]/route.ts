import { z } from 'zod';
import { patternSchema } from '@/components/patterns/pattern-schema';
import { removePattern, updatePattern } from '@/db/queries/patterns';
import { route } from '@/lib/request/route';
import { orNotFound, unwrap } from '@/lib/request/written';

const params = z.object({ patternId: z.uuid() });

export const PATCH = route(
  { access: 'viewer', params, body: z.strictObject({ version: z.int().positive(), pattern: patternSchema }) },
  async ({ viewer, params, body }) =>
    unwrap(await updatePattern(viewer, params.patternId, body.version, body.pattern)),
);

export const DELETE = route({ access: 'viewer', params }, async ({ viewer, params }) => {
  orNotFound(await removePattern(viewer, params.patternId));
  return { removed: true };
});
