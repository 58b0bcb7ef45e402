import { z } from 'zod';
import { emailSchema, tokenSchema } from '@/components/account/account-schema';

export const inviteSchema = z.strictObject({
  id: z.uuid(),
  email: emailSchema,
  level: z.enum(['read', 'fit']),
  expiresInDays: z.int().min(1, 'At least one day.').max(365, 'At most a year; it can be given again.'),
});
export type InviteForm = z.infer<typeof inviteSchema>;
/** As it stands in the fields, before the address is tidied. */
export type InviteFields = z.input<typeof inviteSchema>;

const answer = z.enum(['accept', 'decline', 'block']);
export type InvitationAnswer = z.infer<typeof answer>;
export const invitationAnswerSchema = z.strictObject({ answer });
export const invitationByLinkSchema = z.strictObject({ token: tokenSchema.shape.token, answer });
