import type { BodyLength } from '../flat-check/flat-check';
import { isMeasureId, MEASURE_IDS, measureOf, type MeasureId, type WaistPlace } from '../measuring/measures';
import { combineTakes } from '../measuring/takes';

/** One sitting with the tape. */
export interface MeasuredSet {
  takenAlone: boolean;
  waistPlace: WaistPlace;
  values: readonly { measure: string; valueMm: number }[];
}

export type BodyLengths = Partial<Record<MeasureId, BodyLength>>;

/**
 * The body as it was last measured: of each measure the newest sitting that has it, its takes together. A length from the waist
 * comes from the newest sitting with the pattern's waist, where there is one.
 * @param sets newest first, lengths in mm
 * @param patternWaist null where nobody said
 */
export function bodyOf(sets: readonly MeasuredSet[], patternWaist: WaistPlace | null): BodyLengths {
  const body: BodyLengths = {};
  for (const measure of MEASURE_IDS) {
    const having = sets.filter(({ values }) => values.some((value) => value.measure === measure));
    const fromThere = having.find(({ waistPlace }) => waistPlace === patternWaist);
    const set = (measureOf(measure).needsWaist ? fromThere : undefined) ?? having[0];
    if (!set) continue;
    const takes = set.values.flatMap((value) => (value.measure === measure ? [value.valueMm] : []));
    const { meanMm, sdMm } = combineTakes(measure, takes, set.takenAlone);
    body[measure] = { meanMm, sdMm, waist: set.waistPlace };
  }
  const rise = riseFromSeams(body);
  if (!body['seated-depth'] && rise) body['seated-depth'] = rise;
  return body;
}

/**
 * The tailor's body rise, outseam less inseam, where nobody sat down for the crotch depth (standards:D07): less sure than
 * either seam, for both errors are in it. Null where one of the two was not taken.
 */
export function riseFromSeams({ outseam, inseam }: BodyLengths): BodyLength | null {
  if (!outseam || !inseam || outseam.meanMm <= inseam.meanMm) return null;
  const sdMm = Math.hypot(outseam.sdMm, inseam.sdMm);
  return { meanMm: outseam.meanMm - inseam.meanMm, sdMm, waist: outseam.waist };
}

/** The girths and lengths alone, mm. */
export const girthsOf = (body: BodyLengths): Partial<Record<MeasureId, number>> =>
  Object.fromEntries(Object.entries(body).map(([id, { meanMm }]) => [id, meanMm]));

/** Values of ids that are known, by id. */
export const byMeasure = <T>(values: Readonly<Record<string, T>>): Partial<Record<MeasureId, T>> =>
  Object.fromEntries(Object.entries(values).filter(([id]) => isMeasureId(id)));
