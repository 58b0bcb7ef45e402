import { z } from 'zod';
import { changeEditSchema } from '@/components/round/round-schema';
import { dropChange, updateChange } from '@/db/queries/changes';
import { findPlanned } from '@/db/queries/stop-marks';
import { refusePastStop } from '@/lib/request/past-stop';
import { readAmount } from '@/lib/request/read-amount';
import { route } from '@/lib/request/route';
import { orNotFound, unwrap } from '@/lib/request/written';

const params = z.object({ changeId: z.uuid() });

export const PATCH = route(
  { access: 'viewer', params, body: changeEditSchema },
  async ({ viewer, params, body: { version, planned, made, ...edit } }) => {
    const plan = planned ? readAmount(planned, 'planned') : null;
    const real = made ? readAmount(made, 'made') : null;
    const now = orNotFound(await findPlanned(viewer, params.changeId));
    const { reason = now.reason } = edit;
    if (plan || edit.reason !== undefined)
      await refusePastStop(viewer, { ...now, reason, plannedMm: plan?.mm ?? now.plannedMm });
    return unwrap(
      await updateChange(viewer, params.changeId, version, {
        ...edit,
        ...(plan ? { plannedMm: plan.mm, plannedTyped: plan.typed } : {}),
        ...(made === undefined ? {} : { madeMm: real?.mm ?? null, madeTyped: real?.typed ?? null }),
      }),
    );
  },
);

export const DELETE = route({ access: 'viewer', params }, async ({ viewer, params }) => {
  orNotFound(await dropChange(viewer, params.changeId));
  return { removed: true };
});
