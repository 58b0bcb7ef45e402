import { z } from 'zod';

/** The measures that size a reading, top to bottom. How each is taken belongs to the handbook. */
export const MEASURES = ['waist', 'hip', 'thigh', 'knee', 'calf'] as const;
export type Measure = (typeof MEASURES)[number];

export const MEASURE_WORDS: Record<Measure, { label: string; how: string }> = {
  waist: { label: 'Waist', how: 'Round the place where the band will sit, on a tied string.' },
  hip: { label: 'Hip', how: 'Round the fullest place of seat and thighs, the tape level.' },
  thigh: { label: 'Thigh', how: 'Round one leg, 25 mm (1 in) below the fork, standing.' },
  knee: { label: 'Knee', how: 'Round the bent knee.' },
  calf: { label: 'Calf', how: 'Round the fullest place below the knee.' },
};

export const measurementSetSchema = z.strictObject({
  id: z.uuid(),
  measuredOn: z.iso.date('Write the day as year-month-day.'),
  takenAlone: z.boolean(),
  waistPlace: z.enum(['narrowest', 'navel', 'band']),
  note: z.string().trim().max(400),
  unit: z.enum(['cm', 'in']),
  values: z
    .array(z.strictObject({ measure: z.enum(MEASURES), typed: z.string().min(1).max(24) }))
    .min(1, 'Take at least one measure.')
    .max(MEASURES.length),
});
