import 'server-only';
import { and, desc, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { Millimetres } from '@/diagnosis/units/millimetres';
import { db } from '../client';
import { measurementSets } from '../schema/measurement-sets';
import { measurements } from '../schema/measurements';
import { wearers } from '../schema/wearers';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';

export interface MeasurementSetInput {
  measuredOn: string;
  takenAlone: boolean;
  waistPlace: 'narrowest' | 'navel' | 'band';
  note: string;
  /** Several takes of one measure count from 1. */
  values: { measure: string; take?: number; valueMm: Millimetres; typed: string }[];
}

export interface MeasurementSetDto extends Omit<MeasurementSetInput, 'values'> {
  id: string;
  values: { measure: string; take: number; valueMm: number; typed: string }[];
}

const ownWearerIds = (viewer: Viewer) =>
  db()
    .select({ id: wearers.id })
    .from(wearers)
    .where(and(eq(wearers.ownerId, viewer.userId), isNull(wearers.deletedAt)));

/** The sittings with the tape of one wearer, newest first, at most 50. Empty for a wearer that is not the viewer's. */
export function listMeasurementSets(viewer: Viewer, wearerId: string): Promise<MeasurementSetDto[]> {
  return db()
    .select({
      id: measurementSets.id,
      measuredOn: measurementSets.measuredOn,
      takenAlone: measurementSets.takenAlone,
      waistPlace: measurementSets.waistPlace,
      note: measurementSets.note,
      values: sql<MeasurementSetDto['values']>`(
        select coalesce(json_agg(json_build_object('measure', m.measure, 'take', m.take, 'valueMm', m.value_mm, 'typed', m.typed) order by m.measure, m.take), '[]')
        from measurements m where m.set_id = measurement_sets.id)`,
    })
    .from(measurementSets)
    .where(
      and(
        eq(measurementSets.wearerId, wearerId),
        inArray(measurementSets.wearerId, ownWearerIds(viewer)),
        isNull(measurementSets.deletedAt),
      ),
    )
    .orderBy(desc(measurementSets.measuredOn), desc(measurementSets.id))
    .limit(50);
}

/** False when the wearer is not the viewer's. The same id sent twice is one set. */
export async function addMeasurementSet(
  viewer: Viewer,
  wearerId: string,
  id: string,
  { values, ...set }: MeasurementSetInput,
): Promise<boolean> {
  return db().transaction(async (tx) => {
    const [owned] = await tx
      .select({ id: wearers.id })
      .from(wearers)
      .where(and(eq(wearers.id, wearerId), inArray(wearers.id, ownWearerIds(viewer))));
    if (!owned) return false;
    const made = await tx
      .insert(measurementSets)
      .values({ ...set, id, wearerId })
      .onConflictDoNothing()
      .returning({ id: measurementSets.id });
    if (made.length === 0) return true;
    if (values.length > 0)
      await tx.insert(measurements).values(values.map((value) => ({ ...value, setId: id })));
    await recordAudit(tx, {
      actorId: viewer.userId,
      verb: 'create',
      objectKind: 'measurement-set',
      objectId: id,
    });
    return true;
  });
}
