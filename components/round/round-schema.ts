import { z } from 'zod';
import { CLOTH_KINDS, stretchPercent } from '@/components/patterns/pattern-schema';

export const muslinSchema = z.strictObject({
  cut: z.enum(['full', 'shorts']),
  cloth: z.string().trim().max(120, 'At most 120 characters.'),
  clothKind: z.enum(CLOTH_KINDS),
  stretchPercent,
  isOnGrain: z.boolean(),
  size: z.string().trim().max(40, 'At most 40 characters.'),
  isStraightFromDraft: z.boolean(),
});
export type MuslinForm = z.infer<typeof muslinSchema>;

const wornOn = z.iso.date('Write the day as year-month-day.').nullable();
export const roundSchema = z.discriminatedUnion('begun', [
  z.strictObject({ id: z.uuid(), begun: z.literal('new-cloth'), wornOn, muslin: muslinSchema }),
  z.strictObject({ id: z.uuid(), begun: z.enum(['re-baste', 'patch']), wornOn }),
]);

export const roundEditSchema = z.strictObject({
  version: z.int().positive(),
  note: z.string().max(4000, 'At most 4,000 characters.').optional(),
  wornOn: wornOn.optional(),
  hangsClean: z.boolean().optional(),
});

const side = z.enum(['left', 'right', 'both']);
const ref = z.string().min(1).max(80);
const seen = z.int().min(0);
const basis = z.enum(['round', 'piece', 'edge', 'pinch']);
/** What was typed and the unit a bare number took; the length itself is read from it on the server. */
const typedAmount = z.strictObject({ typed: z.string().min(1).max(24), unit: z.enum(['cm', 'in']) });

export const evidenceSchema = z.strictObject({
  signs: z
    .array(z.strictObject({ sign: ref, side, severity: z.int().min(0).max(3).nullable(), seen }))
    .max(300),
  checks: z
    .array(
      z.strictObject({
        check: ref,
        side,
        outcome: ref.nullable(),
        amount: typedAmount.nullable(),
        basis: basis.nullable(),
        places: z.int().min(1).max(8).nullable(),
        seen,
      }),
    )
    .max(200),
  causes: z.array(z.strictObject({ cause: ref, isPresent: z.boolean().nullable(), seen })).max(40),
});
export type EvidenceForm = z.infer<typeof evidenceSchema>;

export const planSchema = z.strictObject({
  id: z.uuid(),
  correction: ref,
  side,
  basis: basis.nullable(),
  amount: typedAmount.nullable(),
  reason: z.string().trim().max(400, 'At most 400 characters.'),
});

export const changeEditSchema = z.strictObject({
  version: z.int().positive(),
  planned: typedAmount.optional(),
  reason: z.string().trim().max(400).optional(),
  made: typedAmount.nullable().optional(),
  isMade: z.boolean().optional(),
});
