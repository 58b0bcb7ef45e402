import { z } from 'zod';
import { CHART_KINDS } from '@/diagnosis/chart/chart';

/** A table as it was pasted; it is read on both sides by the same reader. */
export const chartSchema = z.strictObject({
  kind: z.enum(CHART_KINDS),
  unit: z.enum(['cm', 'in']),
  pasted: z.string().max(400_000, 'At most 400,000 characters.'),
  /** Seam allowance that the tape ran over, for measures of the paper; null where it ran along the seamlines. */
  allowance: z.strictObject({ typed: z.string().min(1).max(24), unit: z.enum(['cm', 'in']) }).nullable(),
  /** Keep what can be read and leave the named cells out. */
  leavesOut: z.boolean(),
});
