import 'server-only';
import { passesStop } from '@/db/queries/stop-marks';
import type { Viewer } from '@/db/queries/viewer';
import { Problem } from './problem';

interface Planned {
  roundId: string;
  correction: string;
  plannedMm: number | null;
  reason: string;
}

const MESSAGE =
  'That is past the stop mark of one round. Say why, and it is saved; the amount stays on your tape meanwhile.';

/** Past the stop mark of a round a reason is wanted, in words: a 422 that names the field. */
export async function refusePastStop(viewer: Viewer, planned: Planned): Promise<void> {
  const { roundId, correction, plannedMm, reason } = planned;
  if (plannedMm === null || reason.trim() !== '') return;
  if (await passesStop(viewer, roundId, correction, plannedMm))
    throw new Problem(422, 'reason-wanted', MESSAGE, { fields: { reason: [MESSAGE] } });
}
