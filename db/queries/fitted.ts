import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import type { Millimetres } from '@/diagnosis/units/millimetres';
import { db } from '../client';
import { fittedMeasures } from '../schema/fitted-measures';
import { journals } from '../schema/journals';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';
import { journalIds, journalOwnedBy } from './visible-to';

export interface FittedInput {
  measure: string;
  valueMm: Millimetres;
  typed: string;
}

/** Keeps the finished measures of a garment that fitted, all of them at once. False where the journal is not the viewer's. */
export async function saveFitted(
  viewer: Viewer,
  journalId: string,
  measures: readonly FittedInput[],
): Promise<boolean> {
  return db().transaction(async (tx) => {
    const [owned] = await tx
      .select({ id: journals.id })
      .from(journals)
      .where(and(eq(journals.id, journalId), inArray(journals.id, journalIds(journalOwnedBy(viewer)))))
      .for('update');
    if (!owned) return false;
    await tx.delete(fittedMeasures).where(eq(fittedMeasures.journalId, journalId));
    if (measures.length > 0) await tx.insert(fittedMeasures).values(measures.map((one) => ({ ...one, journalId }))); // prettier-ignore
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'fitted-measures', objectId: journalId }); // prettier-ignore
    return true;
  });
}
