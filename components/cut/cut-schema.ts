import { z } from 'zod';
import { SHEET_LINE_IDS } from '@/diagnosis/cutting/sheet';
import { MEASURE_IDS, WAIST_PLACES } from '@/diagnosis/measuring/measures';

const measure = z.enum(MEASURE_IDS);
const measures = z.array(measure).max(MEASURE_IDS.length);
const typedLength = z.strictObject({ typed: z.string().min(1).max(24), unit: z.enum(['cm', 'in']) });
const size = z.strictObject({ size: z.string().min(1).max(40), steps: z.int().min(-4).max(4) });

/** Parts of what is decided before the first cut; what is not named stays as it is. */
export const cutSchema = z.strictObject({
  /** 0 while nothing was decided yet. */
  version: z.int().min(0),
  sizes: z.partialRecord(z.enum(['base', ...MEASURE_IDS]), size).optional(),
  patternWaist: z.enum(WAIST_PLACES).nullable().optional(),
  ease: z.partialRecord(measure, typedLength).optional(),
  gauge: z.partialRecord(z.enum(['relaxed', 'pulled', 'rested']), typedLength).optional(),
  cut: z.enum(['full', 'shorts']).optional(),
  isNarrowLeg: z.boolean().optional(),
  altered: measures.optional(),
  leftOut: measures.optional(),
  ticked: z.array(z.enum(SHEET_LINE_IDS)).max(SHEET_LINE_IDS.length).optional(),
});
export type CutForm = z.infer<typeof cutSchema>;

export const fittedSchema = z.strictObject({
  unit: z.enum(['cm', 'in']),
  measures: z
    .array(z.strictObject({ measure, typed: z.string().min(1).max(24) }))
    .max(MEASURE_IDS.length)
    .refine(
      (all) => new Set(all.map((one) => one.measure)).size === all.length,
      'Each measure has one length.',
    ),
});
