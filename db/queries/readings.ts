import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import { v7 } from 'uuid';
import { db } from '../client';
import { readings } from '../schema/readings';
import { rounds } from '../schema/rounds';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';
import { roundFittableBy, roundIds } from './visible-to';

export interface ReadingSnapshot {
  case: unknown;
  output: unknown;
  engine: string;
}

/** Keeps what the engine answered, for good. False when the round is not one the viewer may fit. */
export async function keepReading(
  viewer: Viewer,
  roundId: string,
  snapshot: ReadingSnapshot,
): Promise<boolean> {
  return db().transaction(async (tx) => {
    const [allowed] = await tx
      .select({ id: rounds.id })
      .from(rounds)
      .where(and(eq(rounds.id, roundId), inArray(rounds.id, roundIds(roundFittableBy(viewer)))));
    if (!allowed) return false;
    const id = v7();
    await tx.insert(readings).values({ ...snapshot, id, roundId });
    await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'reading', objectId: id });
    return true;
  });
}
