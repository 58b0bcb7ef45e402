import 'server-only';
import { and, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { Millimetres } from '@/diagnosis/units/millimetres';
import { db } from '../client';
import { changes } from '../schema/changes';
import { rounds } from '../schema/rounds';
import { recordAudit } from './audit';
import { writeGuarded } from './guarded';
import type { Written } from './outcome';
import type { Basis, Side } from './round-facts';
import type { Viewer } from './viewer';
import { roundIds, roundOwnedBy } from './visible-to';

const COLUMNS = {
  id: changes.id,
  correction: changes.correction,
  side: changes.side,
  basis: changes.basis,
  plannedMm: changes.plannedMm,
  plannedTyped: changes.plannedTyped,
  madeMm: changes.madeMm,
  madeTyped: changes.madeTyped,
  madeAt: changes.madeAt,
  reason: changes.reason,
  version: changes.version,
};

export interface PlanInput {
  correction: string;
  side: Side;
  basis: Basis | null;
  plannedMm: Millimetres | null;
  plannedTyped: string | null;
  reason: string;
}

export interface ChangeEdit {
  plannedMm?: Millimetres | null;
  plannedTyped?: string | null;
  reason?: string;
  madeMm?: Millimetres | null;
  madeTyped?: string | null;
  isMade?: boolean;
}

const ownChange = (viewer: Viewer, id: string) =>
  and(eq(changes.id, id), inArray(changes.roundId, roundIds(roundOwnedBy(viewer))));

async function findChange(viewer: Viewer, id: string) {
  const [row] = await db().select(COLUMNS).from(changes).where(ownChange(viewer, id));
  return row ?? null;
}
export type ChangeDto = NonNullable<Awaited<ReturnType<typeof findChange>>>;

/**
 * Takes a change into the plan of a round. The same change on the same side is one row: planning it again sets its amount while
 * it has not been made. Null when the round is not the viewer's, or the change has been made already.
 */
export async function planChange(
  viewer: Viewer,
  roundId: string,
  id: string,
  input: PlanInput,
): Promise<ChangeDto | null> {
  const { plannedMm, plannedTyped, basis, reason } = input;
  return db().transaction(async (tx) => {
    const [owned] = await tx
      .select({ id: rounds.id })
      .from(rounds)
      .where(and(eq(rounds.id, roundId), inArray(rounds.id, roundIds(roundOwnedBy(viewer)))));
    if (!owned) return null;
    const [row] = await tx
      .insert(changes)
      .values({ ...input, id, roundId, authorId: viewer.userId })
      .onConflictDoUpdate({
        target: [changes.roundId, changes.correction, changes.side],
        set: { plannedMm, plannedTyped, basis, reason, version: sql`${changes.version} + 1` },
        setWhere: isNull(changes.madeAt),
      })
      .returning(COLUMNS);
    if (!row) return null;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'change', objectId: row.id });
    return row;
  });
}

/** Sets the planned amount, or says what was really made of it. */
export function updateChange(
  viewer: Viewer,
  id: string,
  seenVersion: number,
  edit: ChangeEdit,
): Promise<Written<ChangeDto>> {
  const { isMade, ...columns } = edit;
  const set = {
    ...columns,
    ...(isMade === undefined ? {} : { madeAt: isMade ? sql`coalesce(${changes.madeAt}, now())` : null }),
    version: sql`${changes.version} + 1`,
  };
  return writeGuarded({
    viewer,
    objectKind: 'change',
    id,
    edit,
    write: async (tx) => {
      const mine = and(ownChange(viewer, id), eq(changes.version, seenVersion));
      return (await tx.update(changes).set(set).where(mine).returning({ id: changes.id })).length > 0;
    },
    find: () => findChange(viewer, id),
  });
}

/** Out of the plan. A change that has been made stays in the ledger: false. */
export async function dropChange(viewer: Viewer, id: string): Promise<boolean> {
  return db().transaction(async (tx) => {
    const gone = await tx
      .delete(changes)
      .where(and(ownChange(viewer, id), isNull(changes.madeAt)))
      .returning({ id: changes.id });
    if (gone.length === 0) return false;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'delete', objectKind: 'change', objectId: id });
    return true;
  });
}
