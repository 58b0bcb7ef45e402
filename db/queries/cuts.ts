import 'server-only';
import { and, eq, inArray, sql } from 'drizzle-orm';
import type { WaistPlace } from '@/diagnosis/measuring/measures';
import { db } from '../client';
import { journalCuts } from '../schema/journal-cuts';
import { journals } from '../schema/journals';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { wearers } from '../schema/wearers';
import { recordAudit } from './audit';
import type { PatternCellDto } from './charts';
import { done, missing, type Written } from './outcome';
import type { Viewer } from './viewer';
import { journalIds, journalOwnedBy } from './visible-to';

interface SetDto {
  takenAlone: boolean;
  waistPlace: WaistPlace;
  measuredOn: string;
  values: { measure: string; valueMm: number }[];
}

const sets = sql<SetDto[]>`(
  select coalesce(json_agg(recent.one), '[]') from (
    select json_build_object('takenAlone', s.taken_alone, 'waistPlace', s.waist_place, 'measuredOn', s.measured_on, 'values',
      (select coalesce(json_agg(json_build_object('measure', m.measure, 'valueMm', m.value_mm) order by m.measure, m.take), '[]') from measurements m where m.set_id = s.id)) as one
    from measurement_sets s where s.wearer_id = wearers.id and s.deleted_at is null
    order by s.measured_on desc, s.id desc limit 20
  ) recent)`;

const cells = sql<PatternCellDto[]>`(
  select coalesce(json_agg(json_build_object('size', m.size_name, 'sizeOrdinal', m.size_ordinal, 'measure', m.measure, 'kind', m.kind,
    'valueMm', m.value_mm, 'untilMm', m.until_mm, 'typed', m.typed) order by m.size_ordinal), '[]')
  from pattern_measures m where m.pattern_version_id = pattern_versions.id)`;

/** Measures of garments of this wearer that fitted, this one left out. */
interface FittedDto {
  garment: string;
  maker: string;
  cloth: 'woven' | 'stretch-woven' | 'knit';
  waist: WaistPlace | null;
  measure: string;
  valueMm: number;
}
const fittedElsewhere = sql<FittedDto[]>`(
  select coalesce(json_agg(json_build_object('garment', j.name, 'maker', p.maker, 'cloth', v.cloth_kind, 'waist', c.pattern_waist, 'measure', f.measure, 'valueMm', f.value_mm)), '[]')
  from fitted_measures f
  join journals j on j.id = f.journal_id and j.deleted_at is null and j.id <> journals.id and j.wearer_id = wearers.id
  join pattern_versions v on v.id = j.pattern_version_id join patterns p on p.id = v.pattern_id and p.deleted_at is null
  left join journal_cuts c on c.journal_id = j.id)`;

const fittedHere = sql<{ measure: string; typed: string }[]>`(
  select coalesce(json_agg(json_build_object('measure', f.measure, 'typed', f.typed)), '[]') from fitted_measures f where f.journal_id = journals.id)`;

const CHOICES = {
  sizes: journalCuts.sizes,
  patternWaist: journalCuts.patternWaist,
  ease: journalCuts.ease,
  gauge: journalCuts.gauge,
  cut: journalCuts.cut,
  isNarrowLeg: journalCuts.isNarrowLeg,
  altered: journalCuts.altered,
  leftOut: journalCuts.leftOut,
  ticked: journalCuts.ticked,
  version: journalCuts.version,
};

export type CutChoices = Omit<typeof journalCuts.$inferSelect, 'journalId' | 'createdAt'>;
const UNDECIDED: CutChoices = { sizes: {}, patternWaist: null, ease: {}, gauge: {}, cut: 'full', isNarrowLeg: false, altered: [], leftOut: [], ticked: [], version: 0 }; // prettier-ignore

/** Everything that is known before the first cut of a garment, or null where the journal is not the viewer's. */
export async function findCut(viewer: Viewer, journalId: string) {
  const [row] = await db()
    .select({
      journalId: journals.id,
      journalName: journals.name,
      isSettled: sql<boolean>`${journals.settledAt} is not null`,
      rounds: sql<number>`(select count(*)::int from rounds r where r.journal_id = journals.id and r.deleted_at is null)`,
      firstRoundId: sql<string | null>`(select r.id from rounds r where r.journal_id = journals.id and r.deleted_at is null order by r.number limit 1)`,
      wearerId: wearers.id,
      wearerName: wearers.name,
      patternId: patterns.id,
      patternName: patterns.name,
      maker: patterns.maker,
      garment: patterns.garment,
      clothKind: patternVersions.clothKind,
      stretchPercent: patternVersions.stretchPercent,
      sets,
      cells,
      fittedElsewhere,
      fittedHere,
      choices: CHOICES,
    })
    .from(journals)
    .innerJoin(wearers, eq(wearers.id, journals.wearerId))
    .innerJoin(patternVersions, eq(patternVersions.id, journals.patternVersionId))
    .innerJoin(patterns, eq(patterns.id, patternVersions.patternId))
    .leftJoin(journalCuts, eq(journalCuts.journalId, journals.id))
    .where(and(eq(journals.id, journalId), journalOwnedBy(viewer)));
  return row ? { ...row, choices: row.choices ?? UNDECIDED } : null;
} // prettier-ignore
export type CutDto = NonNullable<Awaited<ReturnType<typeof findCut>>>;

export type CutEdit = Partial<Omit<CutChoices, 'version'>>;

/** Writes what was decided, guarded by the version seen (0 while nothing was). */
export async function saveCut(
  viewer: Viewer,
  journalId: string,
  seenVersion: number,
  edit: CutEdit,
): Promise<Written<CutChoices>> {
  const isWritten = await db().transaction(async (tx) => {
    const [owned] = await tx
      .select({ id: journals.id })
      .from(journals)
      .where(and(eq(journals.id, journalId), inArray(journals.id, journalIds(journalOwnedBy(viewer)))))
      .for('update');
    if (!owned) return false;
    const rows =
      seenVersion === 0
        ? await tx.insert(journalCuts).values({ ...edit, journalId }).onConflictDoNothing().returning({ id: journalCuts.journalId })
        : await tx
            .update(journalCuts)
            .set({ ...edit, version: sql`${journalCuts.version} + 1` })
            .where(and(eq(journalCuts.journalId, journalId), eq(journalCuts.version, seenVersion)))
            .returning({ id: journalCuts.journalId });
    if (rows.length === 0) return false;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'journal-cut', objectId: journalId, fields: Object.keys(edit) });
    return true;
  });
  const now = await findCut(viewer, journalId);
  if (!now) return missing();
  return isWritten ? done(now.choices) : { kind: 'conflict', mine: edit, theirs: now.choices };
} // prettier-ignore
