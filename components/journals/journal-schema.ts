import { z } from 'zod';

const id = z.uuid();

export const journalSchema = z.strictObject({
  id,
  name: z.string().trim().min(1, 'What you call it.').max(120, 'At most 120 characters.'),
  wearerId: id,
  patternDraftId: id,
});

export const journalEditSchema = z.strictObject({
  version: z.int().positive(),
  name: journalSchema.shape.name.optional(),
  isSettled: z.boolean().optional(),
});
