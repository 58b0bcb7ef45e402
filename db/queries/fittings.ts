import 'server-only';
import { and, desc, eq, inArray, ne, sql } from 'drizzle-orm';
import { db } from '../client';
import { journals } from '../schema/journals';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { rounds } from '../schema/rounds';
import { users } from '../schema/users';
import type { Viewer } from './viewer';
import { roundFittableBy, roundIds, roundVisibleTo } from './visible-to';
import { wearers } from '../schema/wearers';

/** When someone last put something into a round: signs, marks, comments, proposals; null for never. */
const lastWordOf = (who: ReturnType<typeof sql>) => sql`greatest(
  (select max(s.updated_at) from round_signs s where s.round_id = ${rounds.id} and s.author_id = ${who}),
  (select max(m.updated_at) from marks m join photos p on p.id = m.photo_id where p.round_id = ${rounds.id} and m.author_id = ${who}),
  (select max(c.created_at) from comments c where c.round_id = ${rounds.id} and c.author_id = ${who}),
  (select max(o.created_at) from proposals o where o.round_id = ${rounds.id} and o.author_id = ${who}))`;

/**
 * The rounds of other people that are open to the viewer. What waits for a word of theirs comes first: something was added by
 * its owner since they last said anything.
 */
export function listFittings(viewer: Viewer) {
  const mine = lastWordOf(sql`${viewer.userId}::uuid`);
  const theirs = sql`greatest(${rounds.createdAt}, ${lastWordOf(sql`${journals.ownerId}`)},
    (select max(p.created_at) from photos p where p.round_id = ${rounds.id} and p.deleted_at is null))`;
  const waits = sql<boolean>`coalesce(${mine} < ${theirs}, true)`;
  return db()
    .select({
      roundId: rounds.id,
      journalId: journals.id,
      journalName: journals.name,
      number: rounds.number,
      ownerName: users.displayName,
      waits,
      mayFit: sql<boolean>`${inArray(rounds.id, roundIds(roundFittableBy(viewer)))}`,
    })
    .from(rounds)
    .innerJoin(journals, eq(journals.id, rounds.journalId))
    .innerJoin(users, eq(users.id, journals.ownerId))
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .where(and(roundVisibleTo(viewer), ne(journals.ownerId, viewer.userId)))
    .orderBy(desc(waits), desc(rounds.id))
    .limit(100);
}
export type FittingDto = Awaited<ReturnType<typeof listFittings>>[number];
