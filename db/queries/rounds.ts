import 'server-only';
import { and, eq, inArray, isNull, sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { db, type Executor } from '../client';
import { journals } from '../schema/journals';
import { muslins } from '../schema/muslins';
import { rounds } from '../schema/rounds';
import { recordAudit } from './audit';
import { moveToBin } from './bin';
import { writeGuarded } from './guarded';
import type { Written } from './outcome';
import type { Viewer } from './viewer';
import { journalIds, journalOwnedBy, roundIds, roundOwnedBy } from './visible-to';

export interface MuslinInput {
  cut: 'full' | 'shorts';
  cloth: string;
  clothKind: 'woven' | 'stretch-woven' | 'knit';
  stretchPercent: number;
  isOnGrain: boolean;
  size: string;
  isStraightFromDraft: boolean;
}

export type RoundInput = { wornOn: string | null } & (
  { begun: 'new-cloth'; muslin: MuslinInput } | { begun: 're-baste' | 'patch' }
);

const COLUMNS = {
  id: rounds.id,
  number: rounds.number,
  begun: rounds.begun,
  wornOn: rounds.wornOn,
  note: rounds.note,
  hangsCleanAt: rounds.hangsCleanAt,
  version: rounds.version,
};

async function lastMuslinId(tx: Executor, journalId: string): Promise<string | null> {
  const [last] = await tx
    .select({ id: muslins.id })
    .from(muslins)
    .where(eq(muslins.journalId, journalId))
    .orderBy(sql`${muslins.ordinal} desc`)
    .limit(1);
  return last?.id ?? null;
}

async function cutMuslin(tx: Executor, journalId: string, input: MuslinInput): Promise<string> {
  const id = v7();
  await tx.insert(muslins).values({
    ...input,
    id,
    journalId,
    ordinal: sql`(select coalesce(max(m.ordinal), 0) + 1 from muslins m where m.journal_id = ${journalId})`,
  });
  return id;
}

/**
 * Begins the next round of a journal: on new cloth, or on the muslin of the round before. The journal row is locked while the
 * number is given, so that two phones at once get two numbers; the same id sent twice is one round.
 * @returns the number, or null where the journal is not the viewer's or there is no muslin yet to baste again
 */
export async function createRound(
  viewer: Viewer,
  journalId: string,
  id: string,
  input: RoundInput,
): Promise<number | null> {
  return db().transaction(async (tx) => {
    const [journal] = await tx
      .select({ id: journals.id })
      .from(journals)
      .where(and(eq(journals.id, journalId), inArray(journals.id, journalIds(journalOwnedBy(viewer)))))
      .for('update');
    if (!journal) return null;
    const [made] = await tx
      .select({ number: rounds.number })
      .from(rounds)
      .where(and(eq(rounds.id, id), eq(rounds.journalId, journalId)));
    if (made) return made.number;
    const muslinId =
      input.begun === 'new-cloth'
        ? await cutMuslin(tx, journalId, input.muslin)
        : await lastMuslinId(tx, journalId);
    if (!muslinId) return null;
    const [row] = await tx
      .insert(rounds)
      .values({
        id,
        journalId,
        muslinId,
        begun: input.begun,
        wornOn: input.wornOn,
        number: sql`(select coalesce(max(r.number), 0) + 1 from rounds r where r.journal_id = ${journalId})`,
      })
      .onConflictDoNothing()
      .returning({ number: rounds.number });
    if (!row) return null;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'round', objectId: id });
    return row.number;
  });
}

export interface RoundEdit {
  note?: string | undefined;
  wornOn?: string | null | undefined;
  hangsClean?: boolean | undefined;
}

async function findOwnRound(viewer: Viewer, id: string) {
  const [row] = await db()
    .select(COLUMNS)
    .from(rounds)
    .where(and(eq(rounds.id, id), inArray(rounds.id, roundIds(roundOwnedBy(viewer)))));
  return row ?? null;
}
export type RoundDto = NonNullable<Awaited<ReturnType<typeof findOwnRound>>>;

export function updateRound(
  viewer: Viewer,
  id: string,
  seenVersion: number,
  edit: RoundEdit,
): Promise<Written<RoundDto>> {
  const { hangsClean, ...columns } = edit;
  const set = {
    ...columns,
    ...(hangsClean === undefined ? {} : { hangsCleanAt: hangsClean ? sql`now()` : null }),
    version: sql`${rounds.version} + 1`,
  };
  return writeGuarded({
    viewer,
    objectKind: 'round',
    id,
    edit,
    write: async (tx) => {
      const owned = inArray(rounds.id, roundIds(roundOwnedBy(viewer)));
      const mine = and(eq(rounds.id, id), owned, eq(rounds.version, seenVersion));
      return (await tx.update(rounds).set(set).where(mine).returning({ id: rounds.id })).length > 0;
    },
    find: () => findOwnRound(viewer, id),
  });
}

export const removeRound = (viewer: Viewer, id: string) =>
  moveToBin(
    viewer,
    'round',
    id,
    and(isNull(rounds.deletedAt), inArray(rounds.id, roundIds(roundOwnedBy(viewer)))),
  );
