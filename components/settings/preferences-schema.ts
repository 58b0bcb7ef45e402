import { z } from 'zod';

export const preferencesSchema = z.strictObject({
  displayName: z
    .string()
    .trim()
    .min(1, 'A name, initials or a made-up name.')
    .max(80, 'At most 80 characters.'),
  unit: z.enum(['cm', 'in']),
  words: z.enum(['uk', 'us', 'tailor']),
  hidesMeasurements: z.boolean(),
  isFitter: z.boolean(),
  isPatternMaker: z.boolean(),
});
export type PreferencesForm = z.infer<typeof preferencesSchema>;
