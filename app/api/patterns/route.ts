import { z } from 'zod';
import { patternSchema } from '@/components/patterns/pattern-schema';
import { createPattern, listPatterns } from '@/db/queries/patterns';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const GET = route({ access: 'viewer' }, ({ viewer }) => listPatterns(viewer));

export const POST = route(
  { access: 'viewer', body: z.strictObject({ id: z.uuid(), pattern: patternSchema }) },
  async ({ viewer, body }) => orNotFound(await createPattern(viewer, body.id, body.pattern)),
);
