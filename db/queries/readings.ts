import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import { v7 } from 'uuid';
import { parseCase } from '@/diagnosis/case';
import { caseFromRounds } from '@/diagnosis/case-from-rounds';
import { diagnose } from '@/diagnosis/diagnose';
import { knowledgeOf } from '@/diagnosis/garments/registry';
import { db } from '../client';
import { readings } from '../schema/readings';
import { rounds } from '../schema/rounds';
import { recordAudit } from './audit';
import { findDesk } from './desk';
import type { Viewer } from './viewer';
import { roundFittableBy, roundIds } from './visible-to';

/**
 * Reads a round on the server, by the same core that read it in the browser, and keeps question and answer for good: what the
 * person saw when they decided. False when the round is not one the viewer may fit, or nothing of it can be read.
 */
export async function keepReading(viewer: Viewer, roundId: string): Promise<boolean> {
  const [allowed] = await db()
    .select({ journalId: rounds.journalId, number: rounds.number })
    .from(rounds)
    .where(and(eq(rounds.id, roundId), inArray(rounds.id, roundIds(roundFittableBy(viewer)))));
  const desk = allowed && (await findDesk(viewer, allowed.journalId));
  if (!desk) return false;
  const knowledge = knowledgeOf(desk.garment);
  const until = desk.rounds.filter(({ number }) => number <= allowed.number);
  const parsed = parseCase(knowledge, caseFromRounds(desk.garment, desk, until));
  if (!parsed.ok) return false;
  const output = diagnose(knowledge, parsed.value);
  const id = v7();
  await db().transaction(async (tx) => {
    await tx.insert(readings).values({ id, roundId, case: parsed.value, output, engine: output.engine });
    await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'reading', objectId: id });
  });
  return true;
}
