import 'server-only';
import { and, desc, eq, inArray, isNull, lt, sql } from 'drizzle-orm';
import { db } from '../client';
import { journals } from '../schema/journals';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { wearers } from '../schema/wearers';
import { recordAudit } from './audit';
import { moveToBin } from './bin';
import { writeGuarded } from './guarded';
import type { Written } from './outcome';
import type { Viewer } from './viewer';
import { journalIds, journalOwnedBy, journalVisibleTo } from './visible-to';

/** The last round as its swing ticket tells it: number, date, what was seen on it, what was changed before it. */
export interface TicketDto {
  number: number;
  wornOn: string | null;
  signsSeen: number;
  strongest: number;
  changesBefore: number;
  changesPlanned: number;
  photos: number;
  hangsClean: boolean;
  coverPhotoId: string | null;
  coverRevision: number | null;
}

const tickets = (only: 'last' | 'all') => sql<TicketDto[]>`(
  select coalesce(json_agg(ticket order by ticket.number), '[]') from (
    select r.number, r.worn_on as "wornOn", r.hangs_clean_at is not null as "hangsClean",
      (select count(distinct s.sign) from round_signs s where s.round_id = r.id and s.severity > 0)::int as "signsSeen",
      (select coalesce(max(s.severity), 0) from round_signs s where s.round_id = r.id)::int as strongest,
      (select count(*) from changes c join rounds b on b.id = c.round_id where b.journal_id = r.journal_id and b.deleted_at is null
        and b.number = (select max(p.number) from rounds p where p.journal_id = r.journal_id and p.deleted_at is null and p.number < r.number)
        and c.made_at is not null)::int as "changesBefore",
      (select count(*) from changes c where c.round_id = r.id)::int as "changesPlanned",
      (select count(*) from photos p where p.round_id = r.id and p.deleted_at is null)::int as photos,
      cover.id as "coverPhotoId", cover.revision as "coverRevision"
    from rounds r
    left join lateral (select p.id, p.revision from photos p where p.round_id = r.id and p.deleted_at is null order by p.id limit 1) cover on true
    where r.journal_id = journals.id and r.deleted_at is null
    order by r.number desc
    limit ${only === 'last' ? 1 : 100}
  ) ticket)`;

const COLUMNS = {
  id: journals.id,
  name: journals.name,
  settledAt: journals.settledAt,
  version: journals.version,
  wearerId: wearers.id,
  wearerName: wearers.name,
  patternId: patterns.id,
  patternName: patterns.name,
  garment: patterns.garment,
};

const joined = (viewer: Viewer, only: 'last' | 'all') =>
  db()
    .select({
      ...COLUMNS,
      isOwner: sql<boolean>`${journals.ownerId} = ${viewer.userId}`,
      tickets: tickets(only),
    })
    .from(journals)
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId));

const PAGE = 24;

/** The rail: every garment in work that is the viewer's, newest first; `before` is the id of the last one seen. */
export async function listJournals(viewer: Viewer, before?: string) {
  const rows = await joined(viewer, 'last')
    .where(and(journalOwnedBy(viewer), before === undefined ? undefined : lt(journals.id, before)))
    .orderBy(desc(journals.id))
    .limit(PAGE + 1);
  return { journals: rows.slice(0, PAGE), next: rows.length > PAGE ? (rows[PAGE - 1]?.id ?? null) : null };
}
export type RailJournalDto = Awaited<ReturnType<typeof listJournals>>['journals'][number];

/** A journal with a ticket for each of its rounds. */
export async function findJournal(viewer: Viewer, id: string) {
  const [row] = await joined(viewer, 'all').where(and(eq(journals.id, id), journalVisibleTo(viewer)));
  return row ?? null;
}
export type JournalDto = NonNullable<Awaited<ReturnType<typeof findJournal>>>;

export interface JournalInput {
  name: string;
  wearerId: string;
  patternDraftId: string;
}

/** Wearer and pattern draft must both be the viewer's; else, or when the id is somebody else's, null. */
export async function createJournal(viewer: Viewer, id: string, input: JournalInput): Promise<string | null> {
  return db().transaction(async (tx) => {
    const [allowed] = await tx
      .select({ wearerId: wearers.id, patternVersionId: patternVersions.id })
      .from(wearers)
      .innerJoin(patterns, and(eq(patterns.ownerId, viewer.userId), isNull(patterns.deletedAt)))
      .innerJoin(
        patternVersions,
        and(eq(patternVersions.patternId, patterns.id), eq(patternVersions.id, input.patternDraftId)),
      )
      .where(
        and(eq(wearers.id, input.wearerId), eq(wearers.ownerId, viewer.userId), isNull(wearers.deletedAt)),
      );
    if (!allowed) return null;
    const made = await tx
      .insert(journals)
      .values({ ...allowed, id, name: input.name, ownerId: viewer.userId })
      .onConflictDoNothing()
      .returning({ id: journals.id });
    if (made.length > 0) {
      await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'journal', objectId: id });
      return id;
    }
    const [own] = await tx
      .select({ id: journals.id })
      .from(journals)
      .where(and(eq(journals.id, id), eq(journals.ownerId, viewer.userId)));
    return own?.id ?? null;
  });
}

export interface JournalEdit {
  name?: string | undefined;
  isSettled?: boolean | undefined;
}

export function updateJournal(
  viewer: Viewer,
  id: string,
  seenVersion: number,
  edit: JournalEdit,
): Promise<Written<JournalDto>> {
  const set = {
    ...(edit.name === undefined ? {} : { name: edit.name }),
    ...(edit.isSettled === undefined ? {} : { settledAt: edit.isSettled ? sql`now()` : null }),
    version: sql`${journals.version} + 1`,
  };
  return writeGuarded({
    viewer,
    objectKind: 'journal',
    id,
    edit,
    write: async (tx) => {
      const owned = inArray(journals.id, journalIds(journalOwnedBy(viewer)));
      const mine = and(eq(journals.id, id), owned, eq(journals.version, seenVersion));
      return (await tx.update(journals).set(set).where(mine).returning({ id: journals.id })).length > 0;
    },
    find: async () => {
      const journal = await findJournal(viewer, id);
      return journal?.isOwner ? journal : null;
    },
  });
}

export const removeJournal = (viewer: Viewer, id: string) =>
  moveToBin(viewer, 'journal', id, inArray(journals.id, journalIds(journalOwnedBy(viewer))));
