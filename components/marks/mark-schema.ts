import { z } from 'zod';
import { MARKS_MAX, NOTE_MAX, POINTS_MAX } from './mark-limits-schema';
import { MARK_KINDS } from './model/mark';

const fraction = z.number().min(0).max(1);

const markSchema = z
  .strictObject({
    id: z.uuid(),
    kind: z.enum(MARK_KINDS),
    severity: z.union([z.literal(1), z.literal(2), z.literal(3)]),
    side: z.enum(['left', 'right', 'both']),
    points: z
      .array(z.strictObject({ x: fraction, y: fraction }))
      .min(1)
      .max(POINTS_MAX),
    // The database stores no text with a zero in it.
    note: z
      .string()
      .max(NOTE_MAX)
      .refine((note) => !note.includes('\0'), 'This note holds a character that cannot be kept.'),
  })
  .refine(({ kind, points }) => (kind === 'pin' ? points.length === 1 : points.length > 1), {
    path: ['points'],
    message: 'A pin has one place, every other mark two or more.',
  });

export const marksSaveSchema = z
  .strictObject({
    /** The revision of the photo that was drawn on. */
    revision: z.int().positive(),
    upserts: z.array(z.strictObject({ mark: markSchema, seen: z.int().min(0) })).max(MARKS_MAX),
    deletes: z.array(z.strictObject({ id: z.uuid(), seen: z.int().positive() })).max(MARKS_MAX),
  })
  .refine(({ upserts, deletes }) => {
    const ids = [...upserts.map(({ mark }) => mark.id), ...deletes.map(({ id }) => id)];
    return new Set(ids).size === ids.length;
  }, 'Each mark may be named once.');
