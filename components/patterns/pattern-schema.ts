import { z } from 'zod';

export const CLOTH_KINDS = ['woven', 'stretch-woven', 'knit'] as const;
export const CLOTH_WORDS: Record<(typeof CLOTH_KINDS)[number], string> = {
  woven: 'Woven',
  'stretch-woven': 'Stretch woven',
  knit: 'Knit',
};

export const stretchPercent = z
  .number('A number of per cent, 0 where it does not stretch.')
  .min(0, 'Not below 0.')
  .max(200, 'At most 200 per cent.');

export const patternSchema = z.strictObject({
  name: z.string().trim().min(1, 'What you call it.').max(120, 'At most 120 characters.'),
  maker: z.string().trim().max(120, 'At most 120 characters.'),
  clothKind: z.enum(CLOTH_KINDS),
  stretchPercent,
  notes: z.string().max(4000, 'At most 4,000 characters.'),
});

export type PatternForm = z.infer<typeof patternSchema>;

export const newPattern: PatternForm = {
  name: '',
  maker: '',
  clothKind: 'woven',
  stretchPercent: 0,
  notes: '',
};
