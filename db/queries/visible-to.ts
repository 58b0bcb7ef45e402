import 'server-only';
import { and, eq, exists, isNull, or, sql, type SQL } from 'drizzle-orm';
import { db } from '../client';
import { grants } from '../schema/grants';
import { journals } from '../schema/journals';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { photos } from '../schema/photos';
import { rounds } from '../schema/rounds';
import { wearers } from '../schema/wearers';
import type { Viewer } from './viewer';

const liveGrant = (viewer: Viewer, object: SQL, levels: readonly ('read' | 'fit')[]): SQL =>
  exists(
    db()
      .select({ one: sql`1` })
      .from(grants)
      .where(
        and(
          object,
          eq(grants.subjectUserId, viewer.userId),
          sql`${grants.level} in ${levels}`,
          isNull(grants.revokedAt),
          or(isNull(grants.expiresAt), sql`${grants.expiresAt} > now()`),
        ),
      ),
  );

const READ = ['read', 'fit'] as const;
const FIT = ['fit'] as const;

/** A journal is out of sight while it, its wearer or its pattern lies in the bin. Join journals with wearers, pattern versions and patterns. */
const journalIsKept = and(isNull(journals.deletedAt), isNull(wearers.deletedAt), isNull(patterns.deletedAt));

/** Nothing of someone else's body is shown to others unless they agreed to it, and for as long as they did. */
export const mayShare = or(
  eq(wearers.isSelf, true),
  and(
    eq(wearers.consentsShare, true),
    or(isNull(wearers.consentUntil), sql`${wearers.consentUntil} >= current_date`),
  ),
);

const journalGranted = (viewer: Viewer, levels: readonly ('read' | 'fit')[]) =>
  and(mayShare, liveGrant(viewer, sql`${grants.journalId} = ${journals.id}`, levels));
const roundGranted = (viewer: Viewer, levels: readonly ('read' | 'fit')[]) =>
  and(mayShare, liveGrant(viewer, sql`${grants.roundId} = ${rounds.id}`, levels));

/** For selects from journals joined as above. */
export const journalVisibleTo = (viewer: Viewer) =>
  and(journalIsKept, or(eq(journals.ownerId, viewer.userId), journalGranted(viewer, READ)));
export const journalOwnedBy = (viewer: Viewer) => and(journalIsKept, eq(journals.ownerId, viewer.userId));

/** For selects from rounds joined to a journal joined as above: owned, or granted on the journal or on this one round. */
export const roundVisibleTo = (viewer: Viewer) =>
  and(
    journalIsKept,
    isNull(rounds.deletedAt),
    or(eq(journals.ownerId, viewer.userId), journalGranted(viewer, READ), roundGranted(viewer, READ)),
  );
/** Owner, or an invited fitter: may add an own layer of marks and states. */
export const roundFittableBy = (viewer: Viewer) =>
  and(
    journalIsKept,
    isNull(rounds.deletedAt),
    or(eq(journals.ownerId, viewer.userId), journalGranted(viewer, FIT), roundGranted(viewer, FIT)),
  );
export const roundOwnedBy = (viewer: Viewer) =>
  and(journalIsKept, isNull(rounds.deletedAt), eq(journals.ownerId, viewer.userId));
/** Taking photos of someone else needs their yes to that. */
export const mayPhotograph = or(
  eq(wearers.isSelf, true),
  and(
    eq(wearers.consentsPhotograph, true),
    or(isNull(wearers.consentUntil), sql`${wearers.consentUntil} >= current_date`),
  ),
);
export const photoIsKept = isNull(photos.deletedAt);

/** The joins that the predicates above speak about, as ids of the objects that pass; use as `inArray(x, …)` in updates and deletes. */
export const journalIds = (where: SQL | undefined) =>
  db()
    .select({ id: journals.id })
    .from(journals)
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .where(where);

export const roundIds = (where: SQL | undefined) =>
  db()
    .select({ id: rounds.id })
    .from(rounds)
    .innerJoin(journals, eq(journals.id, rounds.journalId))
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .where(where);
