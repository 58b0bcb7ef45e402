import { z } from 'zod';
import { planSchema } from '@/components/round/round-schema';

const body = z.string().trim().min(1, 'Say something first.').max(2000, 'At most 2,000 characters.');
const ref = z.string().min(1).max(80);
const fraction = z.number().min(0).max(1);

export const commentSchema = z.strictObject({
  id: z.uuid(),
  body,
  /** A place on a photo, as fractions of its current width and height. */
  place: z.strictObject({ photoId: z.uuid(), x: fraction, y: fraction }).nullable(),
  sign: ref.nullable(),
  asksCheck: ref.nullable(),
});
export type CommentForm = z.infer<typeof commentSchema>;
export const commentEditSchema = z.strictObject({ version: z.int().positive(), body });

export const proposalSchema = z.strictObject({
  id: z.uuid(),
  reason: z.string().trim().min(1, 'Say why, in a sentence.').max(2000, 'At most 2,000 characters.'),
  changes: z.array(planSchema).min(1, 'Propose at least one change.').max(12),
});
export type ProposalForm = z.infer<typeof proposalSchema>;

/** Which of its changes are taken; every other one is left. */
export const proposalAnswerSchema = z.strictObject({ taken: z.array(z.uuid()).max(12) });
