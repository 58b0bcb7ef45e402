import 'server-only';
import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { db } from '../client';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { recordAudit } from './audit';
import { moveToBin } from './bin';
import { writeGuarded } from './guarded';
import type { Written } from './outcome';
import type { Viewer } from './viewer';

const COLUMNS = {
  id: patterns.id,
  name: patterns.name,
  maker: patterns.maker,
  garment: patterns.garment,
  version: patterns.version,
  draftId: patternVersions.id,
  clothKind: patternVersions.clothKind,
  stretchPercent: patternVersions.stretchPercent,
  notes: patternVersions.notes,
};

/** The newest draft of each pattern; a journal keeps the one it was cut from. */
const isNewestDraft = sql`${patternVersions.ordinal} = (
  select max(newer.ordinal) from pattern_versions newer where newer.pattern_id = ${patterns.id})`;
const ownedBy = (viewer: Viewer) => and(eq(patterns.ownerId, viewer.userId), isNull(patterns.deletedAt));

export type PatternDto = Awaited<ReturnType<typeof listPatterns>>[number];
export type PatternInput = Pick<PatternDto, 'name' | 'maker' | 'clothKind' | 'stretchPercent' | 'notes'>;

const selectPatterns = (viewer: Viewer, id?: string) =>
  db()
    .select(COLUMNS)
    .from(patterns)
    .innerJoin(patternVersions, and(eq(patternVersions.patternId, patterns.id), isNewestDraft))
    .where(and(ownedBy(viewer), id === undefined ? undefined : eq(patterns.id, id)));

export function listPatterns(viewer: Viewer) {
  return selectPatterns(viewer).orderBy(desc(patterns.id)).limit(200);
}

export async function findPattern(viewer: Viewer, id: string): Promise<PatternDto | null> {
  const [row] = await selectPatterns(viewer, id);
  return row ?? null;
}

const split = ({ name, maker, ...draft }: PatternInput) => ({ pattern: { name, maker }, draft });

/** A pattern with its first draft. The same id sent twice is one pattern; null when the id is somebody else's. */
export async function createPattern(
  viewer: Viewer,
  id: string,
  input: PatternInput,
): Promise<PatternDto | null> {
  const { pattern, draft } = split(input);
  await db().transaction(async (tx) => {
    const made = await tx
      .insert(patterns)
      .values({ ...pattern, id, ownerId: viewer.userId })
      .onConflictDoNothing()
      .returning({ id: patterns.id });
    if (made.length === 0) return;
    await tx.insert(patternVersions).values({ ...draft, id: v7(), patternId: id, ordinal: 1 });
    await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'pattern', objectId: id });
  });
  return findPattern(viewer, id);
}

export function updatePattern(
  viewer: Viewer,
  id: string,
  seenVersion: number,
  edit: PatternInput,
): Promise<Written<PatternDto>> {
  const { pattern, draft } = split(edit);
  return writeGuarded({
    viewer,
    objectKind: 'pattern',
    id,
    edit,
    write: async (tx) => {
      const [row] = await tx
        .update(patterns)
        .set({ ...pattern, version: sql`${patterns.version} + 1` })
        .where(and(eq(patterns.id, id), ownedBy(viewer), eq(patterns.version, seenVersion)))
        .returning({ id: patterns.id });
      if (!row) return false;
      const newest = sql`${patternVersions.ordinal} = (select max(newer.ordinal) from pattern_versions newer where newer.pattern_id = ${id})`;
      await tx
        .update(patternVersions)
        .set({ ...draft, version: sql`${patternVersions.version} + 1` })
        .where(and(eq(patternVersions.patternId, id), newest));
      return true;
    },
    find: () => findPattern(viewer, id),
  });
}

/** Into the bin, with every journal cut from it out of sight. True when there was something to remove. */
export const removePattern = (viewer: Viewer, id: string) =>
  moveToBin(viewer, 'pattern', id, ownedBy(viewer));
