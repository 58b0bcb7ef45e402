import 'server-only';
import { and, asc, eq, inArray, isNull, ne, sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { db, type Executor } from '../client';
import { changes } from '../schema/changes';
import { proposals } from '../schema/proposals';
import { proposedChanges } from '../schema/proposed-changes';
import { rounds } from '../schema/rounds';
import { users } from '../schema/users';
import { recordAudit } from './audit';
import type { PlanInput } from './changes';
import type { Basis, Side } from './round-facts';
import type { Viewer } from './viewer';
import { roundFittableBy, roundIds, roundOwnedBy, roundVisibleTo } from './visible-to';

export interface ProposedChangeDto {
  id: string;
  correction: string;
  side: Side;
  basis: Basis | null;
  plannedMm: number | null;
  reason: string;
  answer: 'taken' | 'left' | null;
}

const items = sql<ProposedChangeDto[]>`(
  select coalesce(json_agg(json_build_object('id', c.id, 'correction', c.correction, 'side', c.side, 'basis', c.basis,
    'plannedMm', c.planned_mm, 'reason', c.reason, 'answer', c.answer) order by c.id), '[]')
  from proposed_changes c where c.proposal_id = proposals.id)`;

/** The plans that were proposed for a round, oldest first, with what became of each change. */
export function listProposals(viewer: Viewer, roundId: string) {
  return db()
    .select({
      id: proposals.id,
      reason: proposals.reason,
      createdAt: proposals.createdAt,
      authorName: users.displayName,
      isMine: sql<boolean>`${proposals.authorId} = ${viewer.userId}`,
      changes: items,
    })
    .from(proposals)
    .innerJoin(users, eq(users.id, proposals.authorId))
    .where(
      and(
        eq(proposals.roundId, roundId),
        inArray(proposals.roundId, roundIds(and(roundVisibleTo(viewer), eq(rounds.id, roundId)))),
      ),
    )
    .orderBy(asc(proposals.id))
    .limit(100);
}
export type ProposalDto = Awaited<ReturnType<typeof listProposals>>[number];

/** Proposes a plan for one round of one wearer. Sent again under its id it is one proposal. False when the viewer may not. */
export async function propose(
  viewer: Viewer,
  roundId: string,
  { id, reason, changes: planned }: { id: string; reason: string; changes: (PlanInput & { id: string })[] },
): Promise<boolean> {
  return db().transaction(async (tx) => {
    const [allowed] = await roundIds(and(roundFittableBy(viewer), eq(rounds.id, roundId)));
    if (!allowed) return false;
    const made = await tx
      .insert(proposals)
      .values({ id, reason, roundId, authorId: viewer.userId })
      .onConflictDoNothing()
      .returning({ id: proposals.id });
    if (made.length > 0) {
      await tx.insert(proposedChanges).values(planned.map((change) => ({ ...change, proposalId: id })));
      await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'proposal', objectId: id });
      return true;
    }
    const own = and(eq(proposals.id, id), eq(proposals.authorId, viewer.userId), eq(proposals.roundId, roundId)); // prettier-ignore
    return (await tx.select({ id: proposals.id }).from(proposals).where(own)).length > 0;
  });
}

/** A change of a proposal into the plan; one that has been made already stays as it is, and nothing is taken. */
async function takeChange(
  tx: Executor,
  viewer: Viewer,
  from: { roundId: string; authorId: string },
  { correction, side, basis, plannedMm, plannedTyped, reason }: PlanInput,
): Promise<boolean> {
  const plan = { basis, plannedMm, plannedTyped, reason, proposedBy: from.authorId };
  const written = await tx
    .insert(changes)
    .values({ id: v7(), roundId: from.roundId, authorId: viewer.userId, correction, side, ...plan })
    .onConflictDoUpdate({
      target: [changes.roundId, changes.correction, changes.side],
      set: { ...plan, version: sql`${changes.version} + 1` },
      setWhere: isNull(changes.madeAt),
    })
    .returning({ id: changes.id });
  return written.length > 0;
}

/**
 * The owner's answer to a proposed plan, given once: the changes named are taken into the plan, under the name of who proposed
 * them; the rest is left.
 * @returns how many were taken, or null where there is nothing of the viewer's to answer
 */
export async function answerProposal(viewer: Viewer, id: string, taken: string[]): Promise<number | null> {
  return db().transaction(async (tx) => {
    const [from] = await tx
      .select({ roundId: proposals.roundId, authorId: proposals.authorId })
      .from(proposals)
      .where(
        and(
          eq(proposals.id, id),
          ne(proposals.authorId, viewer.userId),
          inArray(proposals.roundId, roundIds(roundOwnedBy(viewer))),
        ),
      )
      .for('update');
    if (!from) return null;
    const open = await tx
      .select()
      .from(proposedChanges)
      .where(and(eq(proposedChanges.proposalId, id), isNull(proposedChanges.answer)))
      .orderBy(asc(proposedChanges.id));
    if (open.length === 0) return null;
    let count = 0;
    for (const change of open) {
      const isTaken = taken.includes(change.id) && (await takeChange(tx, viewer, from, change));
      if (isTaken) count += 1;
      await tx
        .update(proposedChanges)
        .set({ answer: isTaken ? 'taken' : 'left', answeredAt: sql`now()` })
        .where(eq(proposedChanges.id, change.id));
    }
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'proposal', objectId: id, fields: ['answer'] }); // prettier-ignore
    return count;
  });
}
