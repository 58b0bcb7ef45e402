import { z } from 'zod';
import { roundEditSchema } from '@/components/round/round-schema';
import { removeRound, updateRound } from '@/db/queries/rounds';
import { route } from '@/lib/request/route';
import { orNotFound, unwrap } from '@/lib/request/written';

const params = z.object({ roundId: z.uuid() });

export const PATCH = route(
  { access: 'viewer', params, body: roundEditSchema },
  async ({ viewer, params, body: { version, ...edit } }) =>
    unwrap(await updateRound(viewer, params.roundId, version, edit)),
);

export const DELETE = route({ access: 'viewer', params }, async ({ viewer, params }) => {
  orNotFound(await removeRound(viewer, params.roundId));
  return { removed: true };
});
