import 'server-only';
import { and, asc, eq, sql } from 'drizzle-orm';
import { db } from '../client';
import { journals } from '../schema/journals';
import { muslins } from '../schema/muslins';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { rounds } from '../schema/rounds';
import { wearers } from '../schema/wearers';
import { latestBody } from './latest-body';
import { roundFacts } from './round-facts';
import { noteLook } from './sharing';
import type { Viewer } from './viewer';
import { roundFittableBy, roundVisibleTo } from './visible-to';

/**
 * Everything the reading of a journal stands on: who it is for, and every round that the viewer may see with what was found in
 * it, oldest first. That someone invited looked is noted. Null when there is none to see.
 */
export async function findDesk(viewer: Viewer, journalId: string) {
  const rows = await db()
    .select({
      journalId: journals.id,
      journalName: journals.name,
      isOwner: sql<boolean>`${journals.ownerId} = ${viewer.userId}`,
      isSettled: sql<boolean>`${journals.settledAt} is not null`,
      wearerName: wearers.name,
      fittedFor: wearers.fittedFor,
      shape: wearers.shape,
      body: latestBody,
      patternName: patterns.name,
      garment: patterns.garment,
      round: {
        id: rounds.id,
        number: rounds.number,
        begun: rounds.begun,
        wornOn: rounds.wornOn,
        note: rounds.note,
        hangsCleanAt: rounds.hangsCleanAt,
        version: rounds.version,
        mayFit: sql<boolean>`(${roundFittableBy(viewer)})`,
        cut: muslins.cut,
        cloth: muslins.cloth,
        clothKind: muslins.clothKind,
        stretchPercent: muslins.stretchPercent,
        isOnGrain: muslins.isOnGrain,
        size: muslins.size,
        ...roundFacts(viewer.userId),
      },
    })
    .from(rounds)
    .innerJoin(muslins, eq(muslins.id, rounds.muslinId))
    .innerJoin(journals, eq(journals.id, rounds.journalId))
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .where(and(eq(rounds.journalId, journalId), roundVisibleTo(viewer)))
    .orderBy(asc(rounds.number));
  const [first] = rows;
  if (!first) return null;
  if (!first.isOwner) await noteLook(viewer, journalId);
  const { round: _round, ...head } = first;
  return { ...head, rounds: rows.map((row) => row.round) };
}
export type DeskDto = NonNullable<Awaited<ReturnType<typeof findDesk>>>;
export type DeskRoundDto = DeskDto['rounds'][number];
