import { z } from 'zod';
import { BASES, CLOTHS } from './garments/schema';

/**
 * The shape of a `Case`: everything known about one fitting. All lengths are millimetres whatever `unit` says.
 * Ids are checked afterwards against a garment's knowledge (`parseCase`).
 */

export const SIDES = ['both', 'left', 'right'] as const;
export const HISTORY_MAX = 24;

/** Nothing on a body is longer than this, mm; a slip of the keys is refused instead of read. */
const LENGTH_MAX_MM = 100_000;
const WEIGHT_MAX = 100;
const length = z.number().min(-LENGTH_MAX_MM).max(LENGTH_MAX_MM);
const above = z.number().positive().max(LENGTH_MAX_MM);
const side = z.enum(SIDES).default('both');

export const signEntry = z.strictObject({
  sign: z.string(),
  severity: z.int().min(0).max(3),
  side,
  reliability: z.number().min(0).max(1).default(1),
});
const absentEntry = z.union([z.string(), z.strictObject({ sign: z.string(), side })]);
const term = z.strictObject({
  dimension: z.string(),
  weight: z.number().min(-WEIGHT_MAX).max(WEIGHT_MAX).default(1),
  side,
});
const measuredEntry = z.strictObject({ terms: z.array(term).min(1), needMm: length, sdMm: above });
const testEntry = z.strictObject({
  check: z.string(),
  outcome: z.string(),
  side,
  amountMm: above.nullable().default(null),
  basis: z.enum(BASES).nullable().default(null),
  places: z.int().min(1).max(8).default(1),
});
const changeEntry = z.strictObject({
  correction: z.string(),
  side,
  amountMm: above.nullable().default(null),
  basis: z.enum(BASES).nullable().default(null),
});

const evidence = {
  signs: z.array(signEntry).default([]),
  absent: z.array(absentEntry).default([]),
  measured: z.array(measuredEntry).default([]),
  tests: z.array(testEntry).default([]),
};

const roundEntry = z.strictObject({
  ...evidence,
  changes: z.array(changeEntry).default([]),
  next: z.enum(['re-baste', 'patch', 'new-cloth']).default('re-baste'),
});

const body = z.strictObject({
  hipMm: above.default(1000),
  waistMm: above.optional(),
  thighMm: above.optional(),
  kneeMm: above.optional(),
  calfMm: above.optional(),
});

export const caseSchema = z.strictObject({
  garment: z.string(),
  unit: z.enum(['mm', 'cm', 'in']).default('mm'),
  body: body.prefault({}),
  fittedFor: z.enum(['standing', 'both', 'seated']).default('standing'),
  muslin: z.enum(['full', 'shorts']).default('full'),
  cloth: z
    .strictObject({
      kind: z.enum(CLOTHS).default('woven'),
      stretchPercent: z.number().min(0).max(400).default(0),
    })
    .prefault({}),
  shape: z.array(z.string()).default([]),
  causes: z
    .strictObject({ present: z.array(z.string()).default([]), absent: z.array(z.string()).default([]) })
    .prefault({}),
  ...evidence,
  history: z.array(roundEntry).max(HISTORY_MAX).default([]),
});

type Parsed = z.output<typeof caseSchema>;
export type CaseInput = z.input<typeof caseSchema>;
export type Side = (typeof SIDES)[number];
export type SignSeen = Parsed['signs'][number];
export type SignAbsent = { sign: string; side: Side };
export type Measured = Parsed['measured'][number];
export type TestResult = Parsed['tests'][number];
export type Change = Parsed['history'][number]['changes'][number];
export type Body = Parsed['body'];

/** One wearing: what was seen, looked for, measured and tried. */
export interface RoundEvidence {
  signs: SignSeen[];
  absent: SignAbsent[];
  measured: Measured[];
  tests: TestResult[];
}

export interface PastRound extends RoundEvidence {
  changes: Change[];
  next: 're-baste' | 'patch' | 'new-cloth';
}

/** A parsed case: defaults filled in, aliases resolved, every id known. */
export type Case = Omit<Parsed, 'absent' | 'history'> & RoundEvidence & { history: PastRound[] };
