import 'server-only';
import { and, eq, isNull, sql } from 'drizzle-orm';
import type { ChartCell, ChartKind } from '@/diagnosis/chart/chart';
import { toMillimetres } from '@/diagnosis/units/millimetres';
import { db } from '../client';
import { patternMeasures } from '../schema/pattern-measures';
import { patternVersions } from '../schema/pattern-versions';
import { patterns } from '../schema/patterns';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';

export type PatternCellDto = ChartCell & { kind: ChartKind; sizeOrdinal: number };

/** The newest draft of a pattern of the viewer's with its tables: what it is for, what it gives, what the paper measures. */
export async function findPatternChart(viewer: Viewer, patternId: string) {
  const [row] = await db()
    .select({
      draftId: patternVersions.id,
      name: patterns.name,
      maker: patterns.maker,
      clothKind: patternVersions.clothKind,
      stretchPercent: patternVersions.stretchPercent,
      allowanceMm: patternVersions.allowanceMm,
      allowanceTyped: patternVersions.allowanceTyped,
      cells: sql<PatternCellDto[]>`(
        select coalesce(json_agg(json_build_object('size', m.size_name, 'sizeOrdinal', m.size_ordinal, 'measure', m.measure, 'kind', m.kind,
          'valueMm', m.value_mm, 'untilMm', m.until_mm, 'typed', m.typed) order by m.size_ordinal), '[]')
        from pattern_measures m where m.pattern_version_id = pattern_versions.id)`,
    })
    .from(patterns)
    .innerJoin(patternVersions, eq(patternVersions.patternId, patterns.id))
    .where(and(eq(patterns.id, patternId), eq(patterns.ownerId, viewer.userId), isNull(patterns.deletedAt)))
    .orderBy(sql`${patternVersions.ordinal} desc`)
    .limit(1);
  return row ?? null;
}
export type PatternChartDto = NonNullable<Awaited<ReturnType<typeof findPatternChart>>>;

/**
 * Puts one table of the newest draft in the place of what stood there.
 * @param cells lengths in mm, sizes from smallest to greatest
 * @returns false where the pattern is not the viewer's
 */
export async function savePatternTable(
  viewer: Viewer,
  patternId: string,
  kind: ChartKind,
  cells: readonly (ChartCell & { sizeOrdinal: number })[],
): Promise<boolean> {
  const found = await findPatternChart(viewer, patternId);
  if (!found) return false;
  const patternVersionId = found.draftId;
  await db().transaction(async (tx) => {
    await tx
      .delete(patternMeasures)
      .where(and(eq(patternMeasures.patternVersionId, patternVersionId), eq(patternMeasures.kind, kind)));
    if (cells.length > 0) {
      const rows = cells.map(({ size, sizeOrdinal, measure, valueMm, untilMm, typed }) => ({
        patternVersionId,
        kind,
        sizeName: size,
        sizeOrdinal,
        measure,
        typed,
        valueMm: toMillimetres(valueMm),
        untilMm: untilMm === null ? null : toMillimetres(untilMm),
      }));
      await tx.insert(patternMeasures).values(rows);
    }
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind: 'pattern', objectId: patternId, fields: [`${kind}-chart`] }); // prettier-ignore
  });
  return true;
}
