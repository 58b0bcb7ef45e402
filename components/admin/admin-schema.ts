import { z } from 'zod';

export const userFlagsSchema = z
  .strictObject({ isSuspended: z.boolean().optional(), isAdmin: z.boolean().optional() })
  .refine((flags) => Object.keys(flags).length > 0, 'Say what is to change.');

const word = z
  .string()
  .regex(/^[a-z-]{1,40}$/)
  .optional()
  .catch(undefined);
/** What does not read as a filter filters nothing. */
export const auditFilterSchema = z.object({
  actorId: z.uuid().optional().catch(undefined),
  verb: word,
  objectKind: word,
  before: z.coerce.number().pipe(z.int().positive()).optional().catch(undefined),
});
export const usersPageSchema = z.object({ before: z.uuid().optional().catch(undefined) });
