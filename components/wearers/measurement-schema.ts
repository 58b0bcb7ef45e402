import { z } from 'zod';
import { MEASURE_IDS, WAIST_PLACES } from '@/diagnosis/measuring/measures';

/** A measure repeated more often than this says no more. */
export const TAKES_MAX = 5;

export const measurementSetSchema = z.strictObject({
  id: z.uuid(),
  measuredOn: z.iso.date('Write the day as year-month-day.'),
  takenAlone: z.boolean(),
  waistPlace: z.enum(WAIST_PLACES),
  note: z.string().trim().max(400),
  unit: z.enum(['cm', 'in']),
  values: z
    .array(
      z.strictObject({
        measure: z.enum(MEASURE_IDS),
        take: z.int().min(1).max(TAKES_MAX).optional(),
        typed: z.string().min(1).max(24),
      }),
    )
    .min(1, 'Take at least one measure.')
    .max(MEASURE_IDS.length * TAKES_MAX)
    .refine(
      (values) => new Set(values.map(({ measure, take = 1 }) => `${measure} ${take}`)).size === values.length,
      'Each take of a measure has its own number.',
    ),
});
