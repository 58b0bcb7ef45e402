import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import { toMillimetres } from '@/diagnosis/units/millimetres';
import { db } from '../client';
import { roundMeasured, type MeasuredTerm } from '../schema/round-measured';
import { rounds } from '../schema/rounds';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';
import { roundIds, roundOwnedBy } from './visible-to';

export interface MeasuredInput {
  label: string;
  terms: MeasuredTerm[];
  needMm: number;
  sdMm: number;
}

/**
 * Puts measured differences into a round, each in the place of an earlier one of its label: the same sum of needs never stands
 * twice. The round is locked meanwhile. False where it is not the viewer's.
 */
export async function putMeasured(
  viewer: Viewer,
  roundId: string,
  measured: readonly MeasuredInput[],
): Promise<boolean> {
  return db().transaction(async (tx) => {
    const [owned] = await tx
      .select({ id: rounds.id })
      .from(rounds)
      .where(and(eq(rounds.id, roundId), inArray(rounds.id, roundIds(roundOwnedBy(viewer)))))
      .for('update');
    if (!owned) return false;
    if (measured.length === 0) return true;
    const labels = measured.map(({ label }) => label);
    await tx
      .delete(roundMeasured)
      .where(and(eq(roundMeasured.roundId, roundId), inArray(roundMeasured.label, labels)));
    await tx.insert(roundMeasured).values(
      measured.map(({ needMm, sdMm, ...rest }) => ({
        ...rest,
        roundId,
        needMm: toMillimetres(needMm),
        sdMm: toMillimetres(sdMm),
      })),
    );
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'round-measured', objectId: roundId }); // prettier-ignore
    return true;
  });
}

/** Takes one measured difference out of its round. False where there is none of the viewer's. */
export async function removeMeasured(viewer: Viewer, id: string): Promise<boolean> {
  return db().transaction(async (tx) => {
    const gone = await tx
      .delete(roundMeasured)
      .where(and(eq(roundMeasured.id, id), inArray(roundMeasured.roundId, roundIds(roundOwnedBy(viewer)))))
      .returning({ id: roundMeasured.id });
    if (gone.length === 0) return false;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'delete', objectKind: 'round-measured', objectId: id }); // prettier-ignore
    return true;
  });
}
