import { z } from 'zod';
import { MARK_KINDS } from './model/mark';

const fraction = z.number().min(0).max(1);

export const markSchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(MARK_KINDS),
  severity: z.union([z.literal(1), z.literal(2), z.literal(3)]),
  side: z.enum(['left', 'right', 'both']),
  points: z
    .array(z.strictObject({ x: fraction, y: fraction }))
    .min(1)
    .max(400),
  note: z.string().max(400),
});

export const marksSaveSchema = z.strictObject({
  /** The revision of the photo that was drawn on. */
  revision: z.int().positive(),
  upserts: z.array(z.strictObject({ mark: markSchema, seen: z.int().min(0) })).max(500),
  deletes: z.array(z.strictObject({ id: z.uuid(), seen: z.int().positive() })).max(500),
});
