import { z } from 'zod';
import { VIEWS } from '@/diagnosis/garments/schema';

export const uploadQuerySchema = z.object({
  key: z.uuid(),
  view: z.enum(VIEWS),
  mirrored: z.enum(['0', '1']).default('0'),
});

export const photoEditSchema = z.strictObject({
  version: z.int32().positive(),
  view: z.enum(VIEWS).optional(),
  isMirrored: z.boolean().optional(),
});
