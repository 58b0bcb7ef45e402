import 'server-only';
import { and, eq, inArray, type SQL } from 'drizzle-orm';
import { bodyOf } from '@/diagnosis/case-from-rounds';
import { knowledgeOf } from '@/diagnosis/garments/registry';
import { isPastStop } from '@/diagnosis/planning/caps';
import { db } from '../client';
import { changes } from '../schema/changes';
import { journals } from '../schema/journals';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { rounds } from '../schema/rounds';
import { wearers } from '../schema/wearers';
import { latestBody } from './latest-body';
import type { Viewer } from './viewer';
import { roundIds, roundOwnedBy } from './visible-to';

/** Used where no hip was measured: the body that the tables are written for, mm. */
const REFERENCE_HIP_MM = 1000;

async function bodyWhere(condition: SQL | undefined) {
  const [row] = await db()
    .select({ body: latestBody, garment: patterns.garment })
    .from(rounds)
    .innerJoin(journals, eq(journals.id, rounds.journalId))
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .where(condition);
  return row ?? null;
}

/** Whether a planned amount passes the stop mark of one round on the body of the viewer's own round. */
export async function passesStop(
  viewer: Viewer,
  roundId: string,
  correctionId: string,
  plannedMm: number,
): Promise<boolean> {
  const row = await bodyWhere(
    and(eq(rounds.id, roundId), inArray(rounds.id, roundIds(roundOwnedBy(viewer)))),
  );
  const correction = row && knowledgeOf(row.garment).corrections.find(({ id }) => id === correctionId);
  if (!correction) return false;
  return isPastStop(correction, { hipMm: REFERENCE_HIP_MM, ...bodyOf(row.body) }, plannedMm);
}

/** What a change of the viewer's holds now, to judge an edit of it by. */
export async function findPlanned(viewer: Viewer, changeId: string) {
  const owned = inArray(changes.roundId, roundIds(roundOwnedBy(viewer)));
  const [row] = await db()
    .select({
      roundId: changes.roundId,
      correction: changes.correction,
      plannedMm: changes.plannedMm,
      reason: changes.reason,
    })
    .from(changes)
    .where(and(eq(changes.id, changeId), owned));
  return row ?? null;
}
