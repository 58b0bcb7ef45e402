import 'server-only';
import { findCut } from '@/db/queries/cuts';
import { putMeasured } from '@/db/queries/measured';
import type { Viewer } from '@/db/queries/viewer';
import { beforeTheCut, evidenceOf } from '@/diagnosis/before-the-cut/before-the-cut';
import { factsOf } from '@/diagnosis/before-the-cut/facts';
import { measuredOf } from '@/diagnosis/flat-check/measured';
import { knowledgeOf } from '@/diagnosis/garments/registry';

/**
 * Puts the flat check of a journal into the reading of one of its rounds: each difference that was not left out, once.
 * @returns how many there were; null where the journal or the round is not the viewer's
 */
export async function carryEvidence(
  viewer: Viewer,
  journalId: string,
  roundId: string,
): Promise<{ taken: number } | null> {
  const cut = await findCut(viewer, journalId);
  if (!cut) return null;
  const found = evidenceOf(beforeTheCut(knowledgeOf(cut.garment), factsOf(cut)));
  return (await putMeasured(viewer, roundId, found.map(measuredOf))) ? { taken: found.length } : null;
}
