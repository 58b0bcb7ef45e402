import { z } from 'zod';
import { CHART_KINDS } from '@/diagnosis/chart/chart';

/** A table as it was pasted; it is read on both sides by the same reader. */
export const chartSchema = z.strictObject({
  kind: z.enum(CHART_KINDS),
  unit: z.enum(['cm', 'in']),
  pasted: z.string().max(400_000, 'At most 400,000 characters.'),
  /** Keep what can be read and leave the named cells out. */
  leavesOut: z.boolean(),
});
